package slantfall.declare;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import slantfall.source.Mark;
import slantfall.source.Source;

/** The user's own rules as checks: requirements on readings, and house rules with the margin they keep. */
public final class Rules {

    private static final Source REQUIRED = Source.of("requirement", "the user's own requirement", Mark.USER);

    private Rules() {}

    /**
     * Requirements and house rules as results.
     *
     * @param published results of the declared checks, in declared order
     * @param out the evaluator's output
     */
    static List<CheckResult> apply(SetUp setUp, Declaration declaration, List<CheckResult> published, double[] out) {
        List<CheckResult> results = new ArrayList<>();
        for (Requirement requirement : setUp.requirements()) {
            declaration
                    .reading(requirement.reading())
                    .ifPresent(reading ->
                            results.add(of(requirement, reading, out[declaration.readingIndex(reading.key())])));
        }
        for (HouseRule rule : setUp.houseRules().values()) {
            published.stream()
                    .filter(r -> r.info().key().equals(rule.rule()))
                    .findFirst()
                    .ifPresent(r -> results.add(of(rule, r)));
        }
        return results;
    }

    /**
     * Margins of the user's own rules from an evaluator's output, for questions.
     *
     * @param out readings, then margins
     * @return margins in the order requirements, house rules; NaN where unknown
     */
    public static double[] margins(SetUp setUp, Declaration declaration, double[] out) {
        double[] margins = new double[setUp.requirements().size() + setUp.houseRules().size()];
        int n = 0;
        for (Requirement requirement : setUp.requirements()) {
            Reading reading = declaration.reading(requirement.reading()).orElse(null);
            margins[n++] = reading == null
                    ? Double.NaN
                    : requirement.margin(reading, out[declaration.readingIndex(reading.key())]);
        }
        for (Map.Entry<String, HouseRule> rule : setUp.houseRules().entrySet()) {
            margins[n++] = declaration.checks().stream()
                    .filter(c -> c.key().equals(rule.getValue().rule()))
                    .findFirst()
                    .map(c -> rule.getValue().margin(c, out[declaration.marginIndex(c.key())]))
                    .orElse(Double.NaN);
        }
        return margins;
    }

    private static CheckResult of(Requirement requirement, Reading reading, double value) {
        double margin = requirement.margin(reading, value);
        boolean lower = Double.isNaN(requirement.atMost())
                || !Double.isNaN(requirement.atLeast())
                        && value - requirement.effectiveLow() < requirement.effectiveHigh() - value;
        Side side = lower ? Side.AT_LEAST : Side.AT_MOST;
        double limit = lower ? requirement.effectiveLow() : requirement.effectiveHigh();
        String sign = lower ? " ≥ " : " ≤ ";
        CheckInfo info = new CheckInfo(
                requirement.checkKey(),
                "requirement",
                "Requirement on " + reading.name().toLowerCase(java.util.Locale.ROOT),
                reading.kind(),
                side,
                Requirement.scaleAt(reading, lower ? requirement.atLeast() : requirement.atMost()),
                reading.span(),
                CheckInfo.NEAR,
                reading.symbol() + sign + "limit",
                "any",
                REQUIRED);
        String note = Double.isNaN(value) ? reading.name() + " is unknown" : requirement.reason();
        return new CheckResult(info, Verdict.of(margin, info.near()), value, limit, margin, true, note, true);
    }

    private static CheckResult of(HouseRule rule, CheckResult published) {
        CheckInfo i = published.info();
        CheckInfo info = new CheckInfo(
                rule.checkKey(),
                i.panel(),
                "House rule: " + i.name(),
                i.kind(),
                i.side(),
                i.scale(),
                i.span(),
                i.near(),
                i.formula(),
                i.range(),
                i.source());
        double margin = rule.margin(i, published.margin());
        return new CheckResult(
                info,
                Verdict.of(margin, i.near()),
                published.value(),
                rule.limit(i, published.limit()),
                margin,
                published.inRange(),
                published.note(),
                true);
    }
}
