/** Exact and numerical solutions of film and slot flow: pure functions, SI in, SI out. */
package slantfall.flow;
