/** Looks: the two themes, the one style sheet by colour roles, names of style classes and marks. */
package slantfall.bench.look;
