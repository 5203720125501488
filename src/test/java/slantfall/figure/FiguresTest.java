package slantfall.figure;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.StringReader;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;
import slantfall.declare.SetUp;
import slantfall.declare.Value;
import slantfall.quantity.UnitSystem;

class FiguresTest {

    private static final Rect AREA = new Rect(0, 0, 560, 320);

    /** One figure. */
    private interface Figure {
        void draw(Pen pen, Rect area, Scene scene);
    }

    private static final List<Figure> FIGURES =
            List.of(Figures::layout, Figures::closeUp, Figures::traverses, Figures::courses, Board::draw);

    static List<String> names() {
        return new ArrayList<>(Cases.all().keySet());
    }

    private static Scene scene(String name) {
        return Scene.still(Cases.assess(Cases.all().get(name)), UnitSystem.SI);
    }

    private static List<String> texts(Figure figure, Scene scene) {
        RecordingPen pen = new RecordingPen();
        figure.draw(pen, AREA, scene);
        return pen.texts;
    }

    @ParameterizedTest
    @MethodSource("names")
    void eachAloneIsInsideTidyAndWellFormed(String name) throws Exception {
        for (Figure figure : FIGURES) {
            RecordingPen pen = new RecordingPen();
            figure.draw(pen, AREA, scene(name));
            BoardPropertyTest.check(pen, AREA);
            assertThat(BoardPropertyTest.meetings(pen)).isEmpty();
            for (Palette palette : Palette.values()) {
                SvgPen svg = new SvgPen(AREA.w(), AREA.h(), palette.colours());
                figure.draw(svg, AREA, scene(name));
                assertThat(parsed(svg.text())).isEqualTo(pen.texts);
                assertThat(svg.text()).doesNotContain("NaN").doesNotContain("null").doesNotContain("Infinity");
            }
        }
    }

    /** The text elements of a picture, read by an XML parser. */
    private static List<String> parsed(String svg) throws Exception {
        NodeList nodes = DocumentBuilderFactory.newInstance().newDocumentBuilder()
                .parse(new InputSource(new StringReader(svg))).getElementsByTagName("text");
        List<String> texts = new ArrayList<>();
        for (int i = 0; i < nodes.getLength(); i++) {
            texts.add(nodes.item(i).getTextContent());
        }
        return texts;
    }

    @Test
    void hostileTextSurvivesTheFile() throws Exception {
        SvgPen pen = new SvgPen(100, 100, Palette.LIGHT.colours());
        pen.text(Pen.Lettering.of(Ink.TEXT, 0), "a<b & \"c\" ]]> \u0001\uFFFFτ", 10, 10);
        assertThat(parsed(pen.text())).containsExactly("a<b & \"c\" ]]> τ");
    }

    @Test
    void traversesAndCoursesNameQuantityAndUnit() {
        assertThat(texts(Figures::traverses, scene("film")))
                .contains("from the wall, mm", "Velocity, m/s", "Shear stress, Pa", "Shear rate, 1/s");
        assertThat(texts(Figures::courses, scene("slot, taper"))).contains("Pressure, kPa(a)", "Gap, mm", "from the inlet, m");
        assertThat(texts(Figures::courses, scene("slot"))).doesNotContain("Gap, mm");
    }

    @Test
    void layoutSaysAngleLengthAndWhetherItIsToScale() {
        assertThat(texts(Figures::layout, scene("film"))).contains("50.0°", "1.00 m", "in", "out", "horizontal", "g")
                .anyMatch(t -> t.startsWith("film") && t.endsWith("drawn wider to be seen"));
        assertThat(texts(Figures::layout, scene("film, thick"))).anyMatch(t -> t.endsWith("true to scale"));
        assertThat(texts(Figures::layout, scene("slot, up"))).contains("−90.0°");
    }

    @Test
    void everyDragOnAWallIsWritten() {
        assertThat(texts(Figures::closeUp, scene("slot")).stream().filter(t -> t.startsWith("drag "))).hasSize(2);
        assertThat(texts(Figures::closeUp, scene("film, gas drags downhill"))).contains("gas drag 20.0 Pa");
    }

    @Test
    void unknownSaysWhy() {
        assertThat(String.join(" ", texts(Figures::traverses, scene("film, turbulent")))).contains("○ unknown", "Only the smooth");
        assertThat(String.join(" ", texts(Figures::traverses, scene("film, level")))).contains("No steady film");
    }

    /** A level slot whose pressure halves what the wall drags along (b³Δp/12μL = Ub/4): the lower part runs back. Invented. */
    @Test
    void whatRunsBackIsFilledAndNamed() {
        SetUp setUp = Cases.with(Cases.slot(), "angle", 0, "wallSpeed", 0.1, "pressureDrop", -75000);
        Scene scene = Scene.still(Cases.assess(setUp), UnitSystem.SI);
        for (Figure figure : List.<Figure>of(Figures::closeUp, Figures::traverses)) {
            RecordingPen pen = new RecordingPen();
            figure.draw(pen, AREA, scene);
            assertThat(pen.texts).anyMatch(t -> t.contains("back"));
            assertThat(pen.marks).anyMatch(m -> m.ink() == Ink.REVERSED && m.what().equals("area"));
        }
        assertThat(texts(Figures::closeUp, scene("slot"))).noneMatch(t -> t.contains("back"));
    }

    /** A name may be cut short in a small picture, its unit never. */
    @Test
    void unitsStandInTheSmallestPicture() {
        for (String name : names()) {
            RecordingPen pen = new RecordingPen();
            Board.draw(pen, new Rect(0, 0, 480, 440), scene(name));
            assertThat(pen.texts).as(name).noneMatch(t -> t.matches("(Pres|Velo|Shear|Gap|from|along).*, ?…"));
            assertThat(pen.texts).as(name).anyMatch(t -> t.matches("from the.*, (m|mm|μm|µm)"));
        }
    }

    /** Arrows in a slot that narrows to a quarter end before its wall. */
    @Test
    void theProfileStaysInsideASlopingWall() {
        RecordingPen pen = new RecordingPen();
        Scene scene = scene("slot, taper");
        Figures.closeUp(pen, AREA, scene);
        List<RecordingPen.Mark> curve = pen.marks.stream().filter(m -> m.what().equals("polyline")).toList();
        double left = pen.marks.stream().filter(m -> m.ink() == Ink.LIQUID).mapToDouble(RecordingPen.Mark::x).min().orElseThrow();
        double right = pen.marks.stream().filter(m -> m.ink() == Ink.LIQUID).mapToDouble(RecordingPen.Mark::x).max().orElseThrow();
        double[] tops = pen.marks.stream().filter(m -> m.ink() == Ink.LIQUID).mapToDouble(RecordingPen.Mark::y).sorted().toArray();
        for (RecordingPen.Mark m : curve) {
            double here = tops[0] + (tops[1] - tops[0]) * (m.x() - left) / (right - left);
            assertThat(m.y()).isGreaterThanOrEqualTo(here - 1.5);
        }
    }

    /** Drags the plate to and fro: the outlet and so the meaning of the pointer stand still, and nothing leaves the paper. */
    @Test
    void theOutletStandsStillWhileTheAngleIsDragged() {
        Holds holds = new Holds();
        SetUp setUp = Cases.film();
        Rect area = new Rect(0, 0, 760, 720);
        Handle angle = handle(setUp, holds, area);
        holds.setDragging(true);
        for (double degrees : new double[] {60, 85, 90, 40, 5, 0, 30}) {
            double wanted = Math.toRadians(degrees);
            setUp = setUp.with("angle", Value.of(wanted));
            Handle moved = handle(setUp, holds, area);
            assertThat(moved.value().at(moved.x(), moved.y())).isCloseTo(wanted, org.assertj.core.data.Offset.offset(1e-9));
            assertThat(angle.value().at(moved.x(), moved.y())).isCloseTo(wanted, org.assertj.core.data.Offset.offset(1e-9));
        }
    }

    private static Handle handle(SetUp setUp, Holds holds, Rect area) {
        RecordingPen pen = new RecordingPen();
        Scene scene = new Scene(Cases.assess(setUp), UnitSystem.SI, holds, Double.NaN);
        Board.Drawn drawn = Board.draw(pen, area, scene);
        BoardPropertyTest.check(pen, area);
        return drawn.handles().stream().filter(h -> h.key().equals("angle")).findFirst().orElseThrow();
    }

    /**
     * Contrast of text 4.5, of graphics 3: W3C, Web Content Accessibility Guidelines 2.1, criteria 1.4.3 and 1.4.11, with
     * the relative luminance defined there. Paper must keep it in grey, so the same numbers hold for a grey print.
     */
    @ParameterizedTest
    @EnumSource(Palette.class)
    void inksCanBeTold(Palette palette) {
        Map<Ink, String> colours = palette.colours();
        Set<Ink> quiet = EnumSet.of(Ink.PAPER, Ink.GRID, Ink.LIQUID);
        Set<Ink> letters = EnumSet.of(Ink.TEXT, Ink.FAINT, Ink.STRESS, Ink.REVERSED, Ink.MOVING_WALL, Ink.CLEAR, Ink.NEAR,
                Ink.CROSSED, Ink.UNKNOWN, Ink.GRAVITY);
        for (Ink ink : Ink.values()) {
            double contrast = contrast(colours.get(ink), colours.get(Ink.PAPER));
            if (!quiet.contains(ink)) {
                assertThat(contrast).as("%s %s", palette, ink).isGreaterThanOrEqualTo(letters.contains(ink) ? 4.5 : 3);
            }
        }
    }

    private static double contrast(String a, String b) {
        double la = luminance(a) + 0.05;
        double lb = luminance(b) + 0.05;
        return Math.max(la, lb) / Math.min(la, lb);
    }

    private static double luminance(String web) {
        int rgb = Integer.parseInt(web.substring(1), 16);
        return 0.2126 * channel(rgb >> 16) + 0.7152 * channel(rgb >> 8) + 0.0722 * channel(rgb);
    }

    private static double channel(int bits) {
        double c = (bits & 255) / 255.0;
        return c <= 0.03928 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
    }
}
