package slantfall.figure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.StringReader;
import java.util.List;
import java.util.Random;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.xml.sax.InputSource;
import slantfall.catalogue.Catalogue;
import slantfall.declare.Assessment;
import slantfall.declare.Declaration;
import slantfall.declare.LiquidBase;
import slantfall.declare.SetUp;
import slantfall.declare.Setting;
import slantfall.declare.Value;
import slantfall.quantity.UnitSystem;
import slantfall.store.Examples;
import slantfall.store.Presets;

class BoardTest {

    private static final Rect AREA = new Rect(0, 0, 760, 720);

    private static SetUp blank(String arrangement) {
        return SetUp.blank(arrangement, LiquidBase.of(Presets.load().find("water").orElseThrow()));
    }

    private static Assessment assess(SetUp setUp) {
        return Catalogue.named(setUp.arrangement()).assess(setUp);
    }

    private static RecordingPen drawn(SetUp setUp, Holds holds) {
        RecordingPen pen = new RecordingPen();
        Board.draw(pen, AREA, new Scene(assess(setUp), UnitSystem.TRADE, holds, 1e-4));
        return pen;
    }

    @Test
    void everySetUpIsDrawnWithFiniteNumbersNearThePaper() {
        Random random = new Random(7);
        for (String arrangement : List.of("inclined-film", "closed-slot")) {
            SetUp base = blank(arrangement);
            Declaration d = Catalogue.named(arrangement).declare(base.structure());
            for (int i = 0; i < 300; i++) {
                SetUp setUp = base;
                for (Setting s : d.coordinates()) {
                    double part = random.nextInt(4) == 0 ? random.nextInt(2) : random.nextDouble();
                    setUp = setUp.with(s.key(), Value.of(s.usual().low() + part * s.usual().span()));
                }
                RecordingPen pen = drawn(setUp, new Holds());
                assertThat(pen.clips).isZero();
                String where = setUp.values().toString();
                assertThat(pen.points).as(where).allMatch(
                        p -> p[0] > -300 && p[0] < 1100 && p[1] > -400 && p[1] < 1200);
                assertThat(pen.texts).noneMatch(t -> t.contains("NaN") || t.contains("Infinity"));
            }
        }
    }

    @Test
    void whatIsSpecialIsSaidInWords() {
        RecordingPen uphill = drawn(blank("inclined-film").with("interfacialShear", Value.of(-4)), new Holds());
        assertThat(uphill.texts).contains("surface runs uphill");
        RecordingPen back = drawn(
                blank("closed-slot").with("angle", Value.of(0)).with("wallSpeed", Value.of(0.2)).with("pressureDrop", Value.of(-2000)),
                new Holds());
        assertThat(back.texts).contains("part runs back").anyMatch(t -> t.startsWith("wall "));
        RecordingPen turbulent = drawn(blank("inclined-film").with("feed", Value.of(3)), new Holds());
        assertThat(turbulent.texts).contains("profile unknown", "○ unknown");
        RecordingPen dry = drawn(blank("inclined-film").with("feed", Value.of(0)), new Holds());
        assertThat(dry.texts).contains("no liquid to draw", "nothing flows");
    }

    @Test
    void axesAndStretchAreLabelled() {
        RecordingPen pen = drawn(blank("closed-slot").with("gapOutlet", Value.of(2e-3)), new Holds());
        assertThat(pen.texts).contains("from the wall, mm", "along the flow, m", "Velocity, m/s", "Pressure, bar(a)");
        assertThat(pen.texts).anyMatch(t -> t.contains("too thick"));
    }

    @Test
    void aHandleMeansTheValueItStandsFor() {
        for (String name : Examples.list()) {
            SetUp setUp = Examples.open(name).setUp();
            Assessment a = assess(setUp);
            Board.Drawn drawn = Board.draw(new RecordingPen(), AREA, Scene.still(a, UnitSystem.SI));
            assertThat(drawn.handles()).isNotEmpty();
            for (Handle h : drawn.handles()) {
                double meant = h.value().at(h.x(), h.y());
                double is = h.dragsReading()
                        ? a.value(h.key())
                        : setUp.value(a.declaration().setting(h.key()).orElseThrow());
                assertThat(meant).as(name + " " + h.key()).isCloseTo(is, within(1e-9 + 1e-6 * Math.abs(is)));
                assertThat(drawn.at(h.x() + 2, h.y() - 1, 10)).isNotNull();
            }
        }
    }

    @Test
    void theAngleHandleTurnsThePlate() {
        SetUp setUp = blank("inclined-film").with("angle", Value.of(Math.toRadians(40)));
        Board.Drawn drawn = Board.draw(new RecordingPen(), AREA, Scene.still(assess(setUp), UnitSystem.SI));
        Handle angle = drawn.handles().stream().filter(h -> h.key().equals("angle")).findFirst().orElseThrow();
        assertThat(angle.value().at(angle.x(), angle.y() - 20)).isGreaterThan(Math.toRadians(40));
        assertThat(angle.value().at(angle.x() - 1000, angle.y() + 1000)).isZero();
    }

    @Test
    void svgIsWellFormedAndSpeaksOfUnits() throws Exception {
        for (Palette palette : Palette.values()) {
            SvgPen pen = new SvgPen(760, 720, palette.colours());
            SetUp setUp = Examples.open(Examples.list().get(1)).setUp();
            Board.draw(pen, AREA, Scene.still(assess(setUp), UnitSystem.US));
            DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(new InputSource(new StringReader(pen.text())));
            assertThat(pen.text()).contains("from the wall, mil", "psi");
        }
    }

    @Test
    void axesHoldStillWhileDraggingAndFitAtRest() {
        Holds holds = new Holds();
        Span first = holds.hold("a", new Span(0, 10));
        holds.setDragging(true);
        assertThat(holds.hold("a", new Span(0, 1))).isEqualTo(first);
        Span wide = holds.hold("a", new Span(0, 20));
        assertThat(wide.high()).isGreaterThanOrEqualTo(20);
        assertThat(holds.hold("a", new Span(0, 21))).isEqualTo(wide);
        holds.setDragging(false);
        assertThat(holds.hold("a", new Span(0, 2)).high()).isEqualTo(2);
    }
}
