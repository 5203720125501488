package slantfall.declare;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The sentence over everything: the user's own rules, the tightest limit, the regimes.
 *
 * @param sentence one line
 * @param about key of the check that it is about, empty if none
 * @param verdict worst verdict among the user's own rules, the limits and the method's validity
 */
public record Headline(String sentence, String about, Verdict verdict) {

    /** Sums an assessment up. */
    public static Headline of(Assessment assessment) {
        List<String> parts = new ArrayList<>();
        List<CheckResult> own = assessment.checks().stream().filter(CheckResult::binding).toList();
        List<CheckResult> crossed = assessment.ownRulesCrossed();
        parts.add(ownRules(own, crossed));
        Optional<CheckResult> tightest = assessment.tightestFirst().stream()
                .filter(c -> c.binding() || !regime(assessment, c))
                .findFirst();
        tightest.ifPresent(c -> parts.add((c.verdict() == Verdict.CROSSED ? "Crossed: " : "Tightest: ")
                + c.info().name() + ", " + MarginWords.of(c) + "."));
        String regimes = regimes(assessment);
        if (!regimes.isEmpty()) {
            parts.add(Character.toUpperCase(regimes.charAt(0)) + regimes.substring(1) + ".");
        }
        return new Headline(
                String.join(" ", parts),
                tightest.map(c -> c.info().key()).orElse(""),
                tightest.map(CheckResult::verdict).orElse(Verdict.UNKNOWN));
    }

    /** The first and the last question of regime that a rule answers; the ones between stand in the panels. */
    private static String regimes(Assessment assessment) {
        List<String> phrases = assessment.panels().stream()
                .filter(p -> p.panel().kindOfPanel() == Panel.Sort.REGIME)
                .filter(p -> p.results().stream().anyMatch(CheckResult::counts))
                .map(PanelResult::phrase)
                .toList();
        return phrases.size() < 3
                ? String.join(", ", phrases)
                : phrases.get(0) + ", " + phrases.get(phrases.size() - 1);
    }

    private static String ownRules(List<CheckResult> own, List<CheckResult> crossed) {
        if (own.isEmpty()) {
            return "No rule of yours is set.";
        }
        long unknown = own.stream().filter(c -> c.verdict() == Verdict.UNKNOWN).count();
        if (!crossed.isEmpty()) {
            return crossed.size() + " of your " + own.size() + (own.size() == 1 ? " rule" : " rules") + " crossed.";
        }
        return unknown > 0 ? unknown + " of your " + own.size() + " rules cannot be told." : "Clear of your rules.";
    }

    private static boolean regime(Assessment assessment, CheckResult check) {
        return assessment.declaration().panels().stream()
                .anyMatch(p -> p.key().equals(check.info().panel()) && p.kindOfPanel() == Panel.Sort.REGIME);
    }
}
