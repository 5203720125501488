/** Readings, checks with their margins, panels of authors, and the working behind a number. */
package slantfall.bench.ledger;
