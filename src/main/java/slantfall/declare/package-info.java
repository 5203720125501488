/**
 * The one face that everything above sees: what an arrangement declares, how it is evaluated and what an assessment
 * holds. Questions, files, console and window are driven by these types alone and know no arrangement by name.
 */
package slantfall.declare;
