/** Pictures on a canvas: section, traverses, courses, with their cursor and drag handles. */
package slantfall.bench.plot;
