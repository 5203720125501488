package slantfall.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;

/** Round trips in every unit, and entries that nobody thought of. */
class QuantityPropertyTest {

    private static final EntryContext CONTEXT = new EntryContext(998.2, 0.4);

    record KindAndUnit(Kind kind, Unit unit) {
    }

    @Provide
    Arbitrary<KindAndUnit> units() {
        List<KindAndUnit> all = new ArrayList<>();
        for (Kind kind : Kind.values()) {
            kind.units().forEach(unit -> all.add(new KindAndUnit(kind, unit)));
        }
        return Arbitraries.of(all);
    }

    @Property(tries = 3000)
    void unitsGoThereAndBack(@ForAll("units") KindAndUnit of, @ForAll @DoubleRange(min = -1e9, max = 1e9) double v) {
        double back = of.unit().fromSi(of.unit().toSi(v, CONTEXT), CONTEXT);
        double zero = of.unit().offset() / of.unit().scale();
        assertThat(back).isCloseTo(v, within(1e-15 * (4 * Math.abs(v) + 4 * Math.abs(zero))));
    }

    @Property(tries = 3000)
    void whatIsPrintedInAUnitIsReadBack(@ForAll("units") KindAndUnit of,
            @ForAll @DoubleRange(min = -1e9, max = 1e9) double v) {
        if (of.unit().symbol().equals("1")) {
            return;
        }
        Entry entry = EntryReader.read(v + " " + of.unit().symbol(), of.kind(), CONTEXT);
        assertThat(entry.si()).isEqualTo(of.unit().toSi(v, CONTEXT));
    }

    @Property(tries = 5000)
    void exactTextComesBackBitForBit(@ForAll Kind kind, @ForAll long bits) {
        double si = Double.longBitsToDouble(bits);
        if (!Double.isFinite(si) || kind.count()) {
            return;
        }
        Entry entry = EntryReader.read(Show.exact(si, kind), kind, EntryContext.none());
        assertThat(Double.doubleToRawLongBits(entry.si())).isEqualTo(Double.doubleToRawLongBits(si));
    }

    @Property(tries = 500)
    void countsComeBackExactly(@ForAll @IntRange(min = 0) int count) {
        assertThat(EntryReader.read(Show.exact(count, Kind.COUNT), Kind.COUNT, CONTEXT).si()).isEqualTo(count);
    }

    @Property(tries = 2000)
    void whatPeopleSeeIsReadBackToItsDigits(@ForAll @DoubleRange(min = -1e12, max = 1e12) double v,
            @ForAll @IntRange(min = 1, max = 12) int digits) {
        Entry entry = EntryReader.read(Show.number(v, digits), Kind.RATIO, CONTEXT);
        assertThat(entry.si()).isCloseTo(v, within(Math.abs(v) * Math.pow(10, 1 - digits)));
    }

    @Property(tries = 1000)
    void decimalCommaAndPointMeanTheSame(@ForAll @IntRange(max = 9999) int whole,
            @ForAll @IntRange(max = 99) int hundredths) {
        String digits = String.format("%02d", hundredths);
        assertThat(EntryReader.read(whole + "," + digits + " mm", Kind.LENGTH, CONTEXT).si())
                .isEqualTo(EntryReader.read(whole + "." + digits + " mm", Kind.LENGTH, CONTEXT).si());
    }

    @Property(tries = 3000)
    void anyTextIsReadOrRefusedInOneLine(@ForAll String text, @ForAll Kind kind) {
        readOrRefuse(text, kind);
    }

    @Provide
    Arbitrary<String> nearlyGood() {
        Arbitrary<String> piece = Arbitraries.of(
                "1", "12", "1,234", "0.5", "e", "E-3", "-", "+", "−", " ", " ", "\u00A0", "mm", "in", "of",
                "product", "water", "psi", "(g)", "(a)", "bar", "/", "(", ")", "*", "·", "^", "2", "²", "⁻¹",
                "kg", "m", "s", "h", "ft", "lb", "gal", "imp ", "%", "°", "C", "F", "Bx", "deg", "from",
                "vertical", ":", "x", "BWG", "OD", "ID", "SG", "wt", "TS", "ream", "±", "points", "of value",
                "sin", "tan", "slope", "per", "sq ", "cu ", "mpa", ",", ".", "'", "\"", "n", "Be", "1/2", "10^",
                "x10^-3");
        return piece.list().ofMinSize(1).ofMaxSize(8).map(parts -> String.join("", parts));
    }

    @Property(tries = 20000)
    void nearlyGoodTextIsReadOrRefusedInOneLine(@ForAll("nearlyGood") String text, @ForAll Kind kind) {
        readOrRefuse(text, kind);
    }

    @Property(tries = 3000)
    void halfWidthsAreReadOrRefusedInOneLine(@ForAll("nearlyGood") String text, @ForAll Kind kind,
            @ForAll double centre) {
        try {
            assertThat(EntryReader.plusMinus(text, kind, centre, CONTEXT)).isFinite().isNotNegative();
        } catch (QuantityProblem problem) {
            assertOneLine(problem);
        }
    }

    private static void readOrRefuse(String text, Kind kind) {
        try {
            Entry entry = EntryReader.read(text, kind, CONTEXT);
            assertThat(entry.si()).isFinite();
            assertThat(entry.echo()).isNotBlank();
        } catch (QuantityProblem problem) {
            assertOneLine(problem);
        }
    }

    private static void assertOneLine(QuantityProblem problem) {
        assertThat(problem.getMessage()).hasSizeLessThan(400).doesNotContain("\n");
        assertThat(problem.remedy()).isNotBlank();
    }
}
