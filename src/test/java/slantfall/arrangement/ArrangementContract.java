package slantfall.arrangement;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;
import slantfall.catalogue.Catalogue;
import slantfall.declare.Arrangement;
import slantfall.declare.Assessment;
import slantfall.declare.CheckInfo;
import slantfall.declare.CheckResult;
import slantfall.declare.Declaration;
import slantfall.declare.Evaluator;
import slantfall.declare.LiquidBase;
import slantfall.declare.Reading;
import slantfall.declare.Scale;
import slantfall.declare.SetUp;
import slantfall.declare.Setting;
import slantfall.declare.Structure;
import slantfall.declare.Value;
import slantfall.declare.Working;
import slantfall.store.ProjectFile;

/** What every arrangement must keep. A test class per arrangement inherits it and names what is special. */
abstract class ArrangementContract {

    /** The arrangement under test. */
    abstract Arrangement arrangement();

    /** Structures to go through, at least one with a preset and one of measured values. */
    abstract List<SetUp> setUps();

    /** Readings that may be unknown inside the usual ranges, each for a physical reason that the test class states. */
    Set<String> mayBeUnknown() {
        return Set.of();
    }

    @Test
    void isInTheCatalogueUnderItsKey() {
        assertThat(Catalogue.named(arrangement().key()).getClass()).isEqualTo(arrangement().getClass());
    }

    @Test
    void keysAreUnique() {
        for (SetUp setUp : setUps()) {
            Declaration d = arrangement().declare(setUp.structure());
            List<String> keys = new ArrayList<>();
            d.allSettings().forEach(s -> keys.add(s.key()));
            d.choices().forEach(c -> keys.add(c.key()));
            assertThat(keys).doesNotHaveDuplicates();
            assertThat(d.readings().stream().map(Reading::key)).doesNotHaveDuplicates();
            assertThat(d.checks().stream().map(CheckInfo::key)).doesNotHaveDuplicates();
            assertThat(d.panels().stream().map(p -> p.key()))
                    .containsExactlyInAnyOrderElementsOf(
                            new LinkedHashSet<>(d.checks().stream().map(CheckInfo::panel).toList()));
            assertThat(d.essentials()).hasSizeLessThanOrEqualTo(4);
        }
    }

    @Test
    void assessmentEqualsTheEvaluator() {
        for (SetUp base : setUps()) {
            for (SetUp setUp : random(base, 30, 1)) {
                Declaration d = arrangement().declare(setUp.structure());
                double[] out = evaluate(setUp, d);
                Assessment a = arrangement().assess(setUp);
                for (int i = 0; i < d.readings().size(); i++) {
                    assertThat(Double.valueOf(a.readings().get(i).value())).isEqualTo(Double.valueOf(out[i]));
                }
                for (int i = 0; i < d.checks().size(); i++) {
                    CheckResult check = a.check(d.checks().get(i).key()).orElseThrow();
                    assertThat(Double.valueOf(check.margin())).isEqualTo(Double.valueOf(out[d.readings().size() + i]));
                    double byValueAndLimit = check.info().margin(check.value(), check.limit());
                    assertThat(Double.isNaN(byValueAndLimit)).isEqualTo(Double.isNaN(check.margin()));
                    if (!Double.isNaN(byValueAndLimit)) {
                        assertThat(check.margin()).as(check.info().key()).isCloseTo(byValueAndLimit, within(1e-12));
                    }
                }
            }
        }
    }

    @Test
    void everyCoordinateChangesSomeOutput() {
        for (SetUp base : setUps()) {
            Declaration d = arrangement().declare(base.structure());
            for (Setting s : d.coordinates()) {
                boolean changes = random(base, 20, 2).stream().anyMatch(setUp -> changes(setUp, d, s));
                assertThat(changes).as(s.key() + " changes some output").isTrue();
            }
        }
    }

    @Test
    void nothingIsUnknownInsideTheUsualRanges() {
        SetUp base = setUps().get(0);
        for (SetUp setUp : random(base, 300, 3)) {
            Assessment a = arrangement().assess(setUp);
            a.readings().stream()
                    .filter(r -> !mayBeUnknown().contains(r.reading().key()))
                    .forEach(r -> assertThat(r.value()).as(r.reading().key() + " of " + setUp.values()).isFinite());
        }
    }

    @Test
    void whatIsUnknownIsExplained() {
        for (SetUp base : setUps()) {
            for (SetUp setUp : random(base, 50, 4)) {
                Assessment a = arrangement().assess(setUp);
                a.readings().stream()
                        .filter(r -> Double.isNaN(r.value()))
                        .forEach(r -> assertThat(a.notices())
                                .as(r.reading().key())
                                .anyMatch(n -> n.about().equals(r.reading().key())));
            }
        }
    }

    @Test
    void theLastStepOfEachWorkingIsItsReading() {
        for (SetUp base : setUps()) {
            for (SetUp setUp : random(base, 50, 5)) {
                Assessment a = arrangement().assess(setUp);
                for (Working w : a.workings()) {
                    double reading = a.value(w.about());
                    assertThat(w.last().result()).as(w.about()).isCloseTo(reading, within(1e-12 * Math.abs(reading)));
                }
            }
        }
    }

    @Test
    void everyKnownReadingHasItsWorking() {
        for (SetUp setUp : random(setUps().get(0), 20, 6)) {
            Assessment a = arrangement().assess(setUp);
            a.readings().stream()
                    .filter(r -> Double.isFinite(r.value()) && r.value() != 0)
                    .forEach(r -> assertThat(a.working(r.reading().key())).as(r.reading().key()).isPresent());
        }
    }

    @Test
    void aPrintedTermIsTheValueUsed() {
        for (SetUp setUp : random(setUps().get(0), 20, 7)) {
            Declaration d = arrangement().declare(setUp.structure());
            Assessment a = arrangement().assess(setUp);
            for (Working w : a.workings()) {
                for (Working.Step step : w.steps()) {
                    for (Working.Term term : step.terms()) {
                        d.coordinates().stream()
                                .filter(s -> s.symbol().equals(term.symbol()))
                                .forEach(s -> assertThat(term.value()).as(w.about() + " " + s.key()).isEqualTo(setUp.value(s)));
                    }
                }
            }
        }
    }

    @Test
    void survivesAFileRoundTrip() {
        for (SetUp base : setUps()) {
            for (SetUp setUp : random(base, 10, 8)) {
                SetUp back = ProjectFile.read(ProjectFile.write(setUp), "round trip").setUp();
                Declaration d = arrangement().declare(back.structure());
                assertThat(back.coordinates(d)).isEqualTo(setUp.coordinates(d));
                assertThat(evaluate(back, d)).isEqualTo(evaluate(setUp, d));
            }
        }
    }

    @Test
    void evaluatorsOfOneStructureAreInterchangeable() {
        for (SetUp base : setUps()) {
            Structure structure = base.structure();
            Declaration d = arrangement().declare(structure);
            Evaluator reused = arrangement().evaluator(structure);
            for (SetUp setUp : random(base, 50, 9)) {
                double[] out = new double[d.outputs()];
                reused.at(setUp.coordinates(d), out);
                assertThat(out).isEqualTo(evaluate(setUp, d));
            }
        }
    }

    @Test
    void verdictsFollowTheMargins() {
        for (SetUp setUp : random(setUps().get(0), 50, 10)) {
            for (CheckResult c : arrangement().assess(setUp).checks()) {
                boolean crossed = c.verdict() == slantfall.declare.Verdict.CROSSED;
                assertThat(crossed).isEqualTo(c.margin() < 0);
                boolean unknown = c.verdict() == slantfall.declare.Verdict.UNKNOWN;
                assertThat(unknown).isEqualTo(Double.isNaN(c.margin()));
            }
        }
    }

    double[] evaluate(SetUp setUp, Declaration d) {
        double[] out = new double[d.outputs()];
        arrangement().evaluator(setUp.structure()).at(setUp.coordinates(d), out);
        return out;
    }

    private boolean changes(SetUp setUp, Declaration d, Setting s) {
        double[] before = evaluate(setUp, d);
        double x = setUp.value(s);
        double y = s.scale() == Scale.LOG ? x * 1.01 : x + 0.01 * s.usual().span();
        y = s.possible().contains(y) ? y : x - 0.01 * s.usual().span();
        double[] after = evaluate(setUp.with(s.key(), Value.of(y)), d);
        for (int i = 0; i < before.length; i++) {
            if (before[i] != after[i] && !(Double.isNaN(before[i]) && Double.isNaN(after[i]))) {
                return true;
            }
        }
        return false;
    }

    /** Set-ups with every coordinate drawn from its usual range, within what the liquid's laws cover. */
    List<SetUp> random(SetUp base, int count, long seed) {
        Random random = new Random(seed);
        Declaration d = arrangement().declare(base.structure());
        List<SetUp> list = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            SetUp setUp = base;
            for (Setting s : d.coordinates()) {
                setUp = setUp.with(s.key(), Value.of(draw(s, random)));
            }
            list.add(setUp);
        }
        return list;
    }

    private static double draw(Setting s, Random random) {
        double low = s.usual().low();
        double high = s.usual().high();
        double part = random.nextDouble();
        return s.scale() == Scale.LOG ? low * Math.pow(high / low, part) : low + part * (high - low);
    }

    static SetUp measured(String arrangement) {
        return SetUp.blank(arrangement, LiquidBase.measured())
                .with("liquid.density", Value.of(1100))
                .with("liquid.viscosity", Value.of(0.02))
                .with("liquid.surfaceTension", Value.of(0.05))
                .with("liquid.conductivity", Value.of(0.5))
                .with("liquid.heatCapacity", Value.of(3500))
                .with("liquid.vapourPressure", Value.of(2000));
    }
}
