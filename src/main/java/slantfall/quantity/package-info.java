/**
 * Quantities at the edges: kinds of quantity, their units, reading what people type, showing numbers.
 *
 * <p>Inside the program every number is coherent SI (radians, kelvin, fractions). This package is the only place that
 * knows other units. What an entry could mean is never guessed: an ambiguous one is refused with the readings it could
 * have ({@link slantfall.quantity.QuantityProblem}), an understood one is echoed in full
 * ({@link slantfall.quantity.Entry#echo()}).
 *
 * <p>How numbers are written. A point is always decimal. A comma is decimal too, except where exactly three digits
 * follow and no leading zero stands before it ({@code 1,234}): that is refused. No-break, thin and figure spaces may
 * group digits in threes; an ordinary space may not, because {@code 1 234} could be two numbers. Exponents are
 * {@code 1.5e-3}, {@code 1.5x10^-3}, {@code 1.5·10⁻³}.
 */
package slantfall.quantity;
