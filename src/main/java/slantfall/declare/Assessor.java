package slantfall.declare;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import slantfall.liquid.Liquid;
import slantfall.liquid.LiquidState;
import slantfall.liquid.Property;
import slantfall.quantity.Show;
import slantfall.quantity.UnitSystem;

/**
 * Gathers an assessment: what is the same for every arrangement (checks with their verdicts, panels, requirements,
 * house rules, the liquid, values outside their usual range) is done here once.
 */
public final class Assessor {

    private final SetUp setUp;
    private final Declaration declaration;
    private final Liquid liquid;
    private final double[] in;
    private final double[] out;
    private final List<CheckResult> published = new ArrayList<>();
    private final List<Working> workings = new ArrayList<>();
    private final List<String> cautions = new ArrayList<>();
    private final List<Notice> notices = new ArrayList<>();
    private Assessment.Profiles profiles = new Assessment.Profiles(Profile.none(), Profile.none());

    /**
     * Starts an assessment by evaluating the set-up.
     *
     * @param evaluator evaluator of the set-up's structure; keeps the case for the checks afterwards
     */
    public Assessor(SetUp setUp, Structure structure, Declaration declaration, Evaluator evaluator) {
        this.setUp = setUp;
        this.declaration = declaration;
        this.liquid = structure.liquid();
        this.in = setUp.coordinates(declaration);
        this.out = new double[declaration.outputs()];
        evaluator.at(in, out);
        noticeUnusual();
    }

    /** The evaluated inputs, in the order of the coordinates. */
    public double[] in() {
        return in.clone();
    }

    /** The value of a reading [SI]. */
    public double reading(String key) {
        return out[declaration.readingIndex(key)];
    }

    /** Applies the declared checks to the case that the arrangement filled in. */
    public <C> Assessor checks(List<? extends Check<C>> checks, C c) {
        for (int i = 0; i < checks.size(); i++) {
            Check<C> check = checks.get(i);
            double margin = out[declaration.readings().size() + i];
            boolean inRange = check.inRange(c);
            CheckInfo info = check.info();
            Verdict verdict = Verdict.of(margin, info.near());
            String note = verdict == Verdict.UNKNOWN
                    ? "something it needs is unknown"
                    : inRange ? "" : "outside its range: " + info.range();
            published.add(new CheckResult(
                    info, verdict, check.value(c), check.limit(c), margin, inRange, note, false));
        }
        return this;
    }

    /** Adds traverses and courses. */
    public Assessor profiles(Profile traverses, Profile courses) {
        profiles = new Assessment.Profiles(traverses, courses);
        return this;
    }

    /** Adds the steps behind readings. */
    public Assessor workings(List<Working> more) {
        workings.addAll(more);
        return this;
    }

    /** Adds warnings where somebody could be hurt. */
    public Assessor cautions(List<String> more) {
        cautions.addAll(more);
        return this;
    }

    /** Adds a condition worth knowing. */
    public Assessor notice(String about, String text) {
        notices.add(new Notice(about, text));
        return this;
    }

    /** The finished assessment. */
    public Assessment finish(LiquidState state) {
        for (String text : liquid.notices(state)) {
            notice("liquid", text);
        }
        noticeMissing();
        for (int i = 0; i < declaration.readings().size(); i++) {
            Reading reading = declaration.readings().get(i);
            boolean explained = notices.stream().anyMatch(n -> n.about().equals(reading.key()));
            if (Double.isNaN(out[i]) && !explained) {
                notice(reading.key(), reading.name() + " is unknown: something it needs is missing or it has no meaning here.");
            }
        }
        List<CheckResult> all = new ArrayList<>(published);
        all.addAll(Rules.apply(setUp, declaration, published, out));
        List<Assessment.ReadingValue> readings = new ArrayList<>();
        for (int i = 0; i < declaration.readings().size(); i++) {
            readings.add(new Assessment.ReadingValue(declaration.readings().get(i), out[i]));
        }
        return new Assessment(
                setUp,
                declaration,
                readings,
                all,
                panels(all),
                LiquidReport.of(setUp),
                profiles,
                workings,
                cautions,
                notices);
    }

    private List<PanelResult> panels(List<CheckResult> all) {
        List<PanelResult> panels = new ArrayList<>();
        for (Panel panel : declaration.panels()) {
            List<CheckResult> own = published.stream()
                    .filter(r -> r.info().panel().equals(panel.key()))
                    .sorted(Comparator.comparingDouble(CheckResult::margin))
                    .toList();
            CheckResult house = all.stream()
                    .filter(r -> r.info().key().equals("house." + panel.key()))
                    .findFirst()
                    .orElse(null);
            panels.add(PanelResult.of(panel, own, house));
        }
        return panels;
    }

    private void noticeMissing() {
        String missing = Arrays.stream(Property.values())
                .filter(p -> declaration.uses().contains(p) && liquid.provision(p).isEmpty())
                .map(p -> p.words() + " (" + Declaration.LIQUID + p.key() + ")")
                .collect(Collectors.joining(", "));
        if (!missing.isEmpty()) {
            notice("liquid", "Not known of this liquid: " + missing + ". Give a measured value; what needs it is unknown.");
        }
    }

    private void noticeUnusual() {
        List<Setting> coordinates = declaration.coordinates();
        for (int i = 0; i < in.length; i++) {
            Setting s = coordinates.get(i);
            if (!s.usual().contains(in[i])) {
                notice(
                        s.key(),
                        s.name() + " " + show(s, in[i]) + " lies outside the usual range " + show(s, s.usual().low())
                                + " to " + show(s, s.usual().high()) + "; it was computed all the same.");
            }
        }
    }

    private static String show(Setting s, double value) {
        return Show.value(value, s.kind(), UnitSystem.SI, 3);
    }
}
