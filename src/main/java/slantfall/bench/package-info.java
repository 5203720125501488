/** The window: opens, and hands over to the shell. The only home of JavaFX. */
package slantfall.bench;
