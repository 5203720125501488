/**
 * Pictures described as data and drawn through one small pen, so that the same figure is on the screen, in a file and on
 * paper. No toolkit is known here.
 */
package slantfall.figure;
