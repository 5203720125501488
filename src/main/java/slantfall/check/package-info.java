/** Panels of rules, one file per family of criteria, on the plain records that arrangements fill. */
package slantfall.check;
