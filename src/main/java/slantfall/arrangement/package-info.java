/** One class per arrangement: declares, gives an evaluator, assesses. */
package slantfall.arrangement;
