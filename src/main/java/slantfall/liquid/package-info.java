/** Liquids: published correlations, measured values and fits, and how each property of a liquid is obtained. */
package slantfall.liquid;
