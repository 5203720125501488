/** Films under air on an incline. */
package slantfall.flow.film;
