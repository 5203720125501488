package slantfall.declare;

import slantfall.quantity.Kind;
import slantfall.source.Source;

/**
 * What is known of a check before any set-up: its words, side, scale and source.
 *
 * @param key {@code PANEL.author-year...}
 * @param panel key of the panel it belongs to
 * @param name author and criterion in words
 * @param kind kind of value and limit; a Reynolds kind names its definition
 * @param side clear side
 * @param scale how the margin is measured
 * @param span for a linear check, the difference that counts as one margin [SI]
 * @param near margin below which a clear verdict is called near
 * @param formula the criterion as a formula
 * @param range where the criterion was tested, in words
 * @param source where it is published
 */
public record CheckInfo(
        String key,
        String panel,
        String name,
        Kind kind,
        Side side,
        Scale scale,
        double span,
        double near,
        String formula,
        String range,
        Source source) {

    /** Margin below which a clear check is near, unless the check says otherwise. */
    public static final double NEAR = 0.1;

    /** A logarithmic check, the usual kind. */
    public static CheckInfo log(Criterion criterion, Kind kind, Side side, Source source) {
        return new CheckInfo(
                criterion.key(),
                criterion.panel(),
                criterion.name(),
                kind,
                side,
                Scale.LOG,
                1,
                NEAR,
                criterion.formula(),
                criterion.range(),
                source);
    }

    /** A linear check. */
    public static CheckInfo linear(Criterion criterion, Kind kind, Side side, double span, Source source) {
        return new CheckInfo(
                criterion.key(),
                criterion.panel(),
                criterion.name(),
                kind,
                side,
                Scale.LINEAR,
                span,
                NEAR,
                criterion.formula(),
                criterion.range(),
                source);
    }

    /** The signed margin of a value and a limit of this check. */
    public double margin(double value, double limit) {
        return Margin.of(side, scale, span, value, limit);
    }

    /**
     * The words of a criterion.
     *
     * @param panel key of its panel
     * @param author the rest of the key: author, year and what tells it from the author's other criteria
     * @param name author and criterion in words
     * @param formula the criterion as a formula
     * @param range where it was tested
     */
    public record Criterion(String panel, String author, String name, String formula, String range) {
        String key() {
            return panel + "." + author;
        }
    }
}
