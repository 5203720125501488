package slantfall.declare;

import java.util.Comparator;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.Optional;

/**
 * Everything computed for a set-up.
 *
 * @param setUp what was asked
 * @param declaration what can be set and read
 * @param readings values of the readings, in declared order [SI], NaN where unknown
 * @param checks published checks in declared order, then requirements and house rules
 * @param panels published checks grouped by question
 * @param liquid properties of the liquid, how each was obtained
 * @param profiles traverses and courses
 * @param workings steps behind the readings
 * @param cautions where somebody could be hurt; each defers to codes and licensed practice
 * @param notices conditions worth knowing
 */
public record Assessment(
        SetUp setUp,
        Declaration declaration,
        List<ReadingValue> readings,
        List<CheckResult> checks,
        List<PanelResult> panels,
        LiquidReport liquid,
        Profiles profiles,
        List<Working> workings,
        List<String> cautions,
        List<Notice> notices) {

    public Assessment {
        readings = List.copyOf(readings);
        checks = List.copyOf(checks);
        panels = List.copyOf(panels);
        workings = List.copyOf(workings);
        cautions = List.copyOf(cautions);
        notices = List.copyOf(notices);
    }

    /** A reading with its value [SI], NaN where unknown. */
    public record ReadingValue(Reading reading, double value) {}

    /** Across and along. */
    public record Profiles(Profile traverses, Profile courses) {}

    /** The value of a reading [SI]. */
    public double value(String key) {
        return readings.stream()
                .filter(r -> r.reading().key().equals(key))
                .findFirst()
                .orElseThrow(() -> new NoSuchElementException("reading " + key))
                .value();
    }

    /** The result of a check, if the set-up has it. */
    public Optional<CheckResult> check(String key) {
        return checks.stream().filter(c -> c.info().key().equals(key)).findFirst();
    }

    /** Checks that count, the smallest margin first. */
    public List<CheckResult> tightestFirst() {
        return checks.stream()
                .filter(CheckResult::counts)
                .sorted(Comparator.comparingDouble(CheckResult::margin))
                .toList();
    }

    /** Requirements and house rules that are crossed. */
    public List<CheckResult> ownRulesCrossed() {
        return checks.stream()
                .filter(c -> c.binding() && c.verdict() == Verdict.CROSSED)
                .toList();
    }

    /** The working of a reading or check, if there is one. */
    public Optional<Working> working(String key) {
        return workings.stream().filter(w -> w.about().equals(key)).findFirst();
    }
}
