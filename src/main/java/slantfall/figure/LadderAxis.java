package slantfall.figure;

import java.util.List;
import slantfall.declare.CheckResult;
import slantfall.declare.Margin;
import slantfall.declare.Scale;
import slantfall.declare.Side;
import slantfall.quantity.Kind;

/**
 * The one axis on which all rules of a panel stand.
 *
 * @param mode what is laid along it
 * @param kind kind of quantity of the axis where it is one
 * @param low left end
 * @param high right end
 */
record LadderAxis(Mode mode, Kind kind, double low, double high) {

    /** What is laid along the axis. */
    enum Mode {
        /** The quantity itself, logarithmic: all rules speak of the same one. */
        QUANTITY,
        /** Value over limit, logarithmic: each rule has its own quantity. */
        RATIO,
        /** The margin: some rule counts in differences, or has no positive limit. */
        MARGIN
    }

    /** Room on both sides of the outermost mark, as a factor. */
    private static final double AIR = 1.5;
    /** A value further from its limit than this factor is drawn at the end of the axis. */
    private static final double FARTHEST = 1e4;
    private static final double LEAST_MARGIN = 1;
    private static final double MOST_MARGIN = 5;
    private static final double SAME = 1e-6;

    /** The axis that suits the rules whose margin is known. */
    static LadderAxis of(List<CheckResult> results) {
        List<CheckResult> known = results.stream().filter(LadderAxis::known).toList();
        if (known.isEmpty() || !known.stream().allMatch(LadderAxis::positive)) {
            double widest = LEAST_MARGIN;
            for (CheckResult r : known) {
                widest = Math.max(widest, Math.min(MOST_MARGIN, Math.abs(r.margin()) * 1.1));
            }
            return new LadderAxis(Mode.MARGIN, Kind.RATIO, -widest, widest);
        }
        Kind kind = known.get(0).info().kind();
        double value = known.get(0).value();
        boolean same = known.stream()
                .allMatch(r -> Math.abs(multiple(kind, r.info().kind()) * r.value() / value - 1) < SAME);
        LadderAxis bare = new LadderAxis(same ? Mode.QUANTITY : Mode.RATIO, kind, 1, 1);
        return bare.around(known);
    }

    private LadderAxis around(List<CheckResult> known) {
        double least = Double.POSITIVE_INFINITY;
        double most = 0;
        for (CheckResult r : known) {
            double near = Math.min(FARTHEST, Math.max(1 / FARTHEST, value(r) / limit(r))) * limit(r);
            least = Math.min(least, Math.min(near, limit(r)));
            most = Math.max(most, Math.max(near, limit(r)));
        }
        return new LadderAxis(mode, kind, least / AIR, most * AIR);
    }

    static boolean known(CheckResult r) {
        return !Double.isNaN(r.margin());
    }

    private static boolean positive(CheckResult r) {
        return r.info().scale() == Scale.LOG && r.value() > 0 && r.limit() > 0
                && Math.abs(r.margin()) < Margin.CLAMP && Double.isFinite(r.value()) && Double.isFinite(r.limit());
    }

    /** How many of one kind make one of another: Γ/μ and 4Γ/μ are the same number by definition; otherwise NaN. */
    private static double multiple(Kind to, Kind from) {
        if (to == from) {
            return 1;
        }
        if (to == Kind.REYNOLDS_FILM && from == Kind.REYNOLDS_FILM_4) {
            return 0.25;
        }
        return to == Kind.REYNOLDS_FILM_4 && from == Kind.REYNOLDS_FILM ? 4 : Double.NaN;
    }

    /** Where the set-up stands by a rule. */
    double value(CheckResult r) {
        switch (mode) {
            case QUANTITY:
                return r.value() * multiple(kind, r.info().kind());
            case RATIO:
                return r.value() / r.limit();
            default:
                return r.margin();
        }
    }

    /** Where its limit stands. */
    double limit(CheckResult r) {
        switch (mode) {
            case QUANTITY:
                return r.limit() * multiple(kind, r.info().kind());
            case RATIO:
                return 1;
            default:
                return 0;
        }
    }

    /** Whether the ends of a margin axis stand for all that lies beyond. */
    boolean full() {
        return mode == Mode.MARGIN && high >= MOST_MARGIN;
    }

    /** Whether a rule is clear on the left of its limit. */
    boolean clearOnTheLeft(CheckResult r) {
        return mode != Mode.MARGIN && r.info().side() == Side.AT_MOST;
    }

    /** Part of the way along the axis, 0 to 1; beyond its ends the end. */
    double part(double at) {
        double part = mode == Mode.MARGIN ? (at - low) / (high - low) : Math.log(at / low) / Math.log(high / low);
        return Math.max(0, Math.min(1, part));
    }
}
