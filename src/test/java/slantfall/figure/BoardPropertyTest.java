package slantfall.figure;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import slantfall.declare.Assessment;
import slantfall.declare.SetUp;
import slantfall.quantity.UnitSystem;

/** Whatever the set-up, the pictures stay finite, inside their rectangle and legible. */
class BoardPropertyTest {

    private static final List<Rect> SIZES =
            List.of(new Rect(0, 0, 760, 720), new Rect(0, 0, 480, 430), new Rect(10, 20, 620, 560), new Rect(0, 0, 1000, 460));

    static List<String> names() {
        return new ArrayList<>(Cases.all().keySet());
    }

    private static Scene scene(SetUp setUp, UnitSystem units, double part) {
        Assessment assessment = Cases.assess(setUp);
        double[] y = assessment.profiles().traverses().axis().values();
        double cursor = y.length == 0 || Double.isNaN(part) ? Double.NaN : part * y[y.length - 1];
        return new Scene(assessment, units, new Holds(), cursor);
    }

    @ParameterizedTest
    @MethodSource("names")
    void everyPointIsFiniteAndInside(String name) {
        for (Rect area : SIZES) {
            for (UnitSystem units : UnitSystem.values()) {
                RecordingPen pen = new RecordingPen();
                Board.draw(pen, area, scene(Cases.all().get(name), units, 0.4));
                check(pen, area);
            }
        }
    }

    @ParameterizedTest
    @MethodSource("names")
    void noTwoTextsMeet(String name) {
        for (double cursor : new double[] {Double.NaN, 0, 0.4, 1}) {
            for (Rect area : SIZES) {
                RecordingPen pen = new RecordingPen();
                Board.draw(pen, area, scene(Cases.all().get(name), UnitSystem.TRADE, cursor));
                assertThat(meetings(pen)).as("%s in %s, cursor %s", name, area, cursor).isEmpty();
            }
        }
    }

    @Property(tries = 150)
    void anyFilm(
            @ForAll @DoubleRange(min = 0, max = 1.57) double angle,
            @ForAll @DoubleRange(min = -9, max = 2) double logFeed,
            @ForAll @DoubleRange(min = -3, max = 2) double logLength,
            @ForAll @DoubleRange(min = -30, max = 30) double shear) {
        draw(Cases.with(Cases.film(), "angle", angle, "feed", Math.pow(10, logFeed), "length", Math.pow(10, logLength),
                "interfacialShear", shear));
    }

    @Property(tries = 150)
    void anySlot(
            @ForAll @DoubleRange(min = -1.57, max = 1.57) double angle,
            @ForAll @DoubleRange(min = -5, max = -0.1) double logGap,
            @ForAll @DoubleRange(min = -5, max = -0.1) double logOutlet,
            @ForAll @DoubleRange(min = -1e6, max = 1e6) double drop,
            @ForAll @DoubleRange(min = -50, max = 50) double wall) {
        draw(Cases.with(Cases.slot(), "angle", angle, "gap", Math.pow(10, logGap), "gapOutlet", Math.pow(10, logOutlet),
                "pressureDrop", drop, "wallSpeed", wall));
    }

    private static void draw(SetUp setUp) {
        Rect area = new Rect(0, 0, 700, 640);
        RecordingPen pen = new RecordingPen();
        Board.draw(pen, area, scene(setUp, UnitSystem.SI, 0.7));
        check(pen, area);
        assertThat(meetings(pen)).isEmpty();
    }

    static void check(RecordingPen pen, Rect area) {
        assertThat(pen.marks).isNotEmpty().allSatisfy(m -> {
            assertThat(m.x()).as(m.what()).isFinite();
            assertThat(m.y()).as(m.what()).isFinite();
        });
        assertThat(pen.marks.stream().filter(m -> m.outside(area)).toList()).as("outside %s", area).isEmpty();
        assertThat(pen.clips).as("clips left open").isZero();
    }

    /** Pairs of texts that cover each other; a text along the slope is judged by its box only if it is short of a quarter turn. */
    static List<String> meetings(RecordingPen pen) {
        List<String> found = new ArrayList<>();
        List<RecordingPen.Said> said = pen.said.stream().filter(s -> s.turn() % 90 == 0).toList();
        for (int i = 0; i < said.size(); i++) {
            for (int k = i + 1; k < said.size(); k++) {
                if (said.get(i).meets(said.get(k))) {
                    found.add(said.get(i).text() + " | " + said.get(k).text());
                }
            }
        }
        return found;
    }

}
