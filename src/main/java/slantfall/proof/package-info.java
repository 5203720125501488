/** The published values that the program carries, and the adapters that recompute them with the production formulas. */
package slantfall.proof;
