/** The frame around the parts: toolbar, headline, columns, files, finder, keyboard. */
package slantfall.bench.shell;
