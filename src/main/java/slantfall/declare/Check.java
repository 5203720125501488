package slantfall.declare;

/**
 * One criterion applied to a case. Pure: no state, no allocation, NaN where something needed is unknown.
 *
 * @param <C> record of the numbers that an arrangement fills in
 */
public interface Check<C> {

    /** Words, side, scale and source. */
    CheckInfo info();

    /** The value compared with the limit [unit of {@code info().kind()}]. */
    double value(C c);

    /** The limit [unit of {@code info().kind()}]. */
    double limit(C c);

    /** Whether the case lies where the criterion was tested. */
    boolean inRange(C c);

    /** Signed margin, 0 at the limit, positive on the clear side. */
    default double margin(C c) {
        return info().margin(value(c), limit(c));
    }
}
