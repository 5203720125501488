/** The settings rail, generated from the declaration: sliders, typed fields, choices, liquid, limits. */
package slantfall.bench.form;
