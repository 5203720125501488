package slantfall.liquid;

import slantfall.source.Source;

/** How a property of a liquid is obtained. */
public sealed interface Provision {

    /** By a published law. */
    record Correlated(Correlation law) implements Provision {}

    /**
     * One number with its source, taken at any state.
     *
     * @param value [SI]
     * @param at where it was measured, in words, empty if not said
     * @param source where it is published
     */
    record Constant(double value, String at, Source source) implements Provision {}

    /** By a fit through the user's measured points. */
    record Fitted(ViscosityFit fit) implements Provision {}

    /** By the user's own measured number, a coordinate. */
    record Measured() implements Provision {}
}
