/** The command line: thin commands over the same core as the window. */
package slantfall.console;
