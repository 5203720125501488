package slantfall.bench.ledger;

import java.util.ArrayList;
import java.util.List;
import slantfall.declare.Working;
import slantfall.quantity.Show;
import slantfall.quantity.UnitSystem;

/** The steps behind a number as lines: formula, values put in, result, source, range. */
final class WorkingText {

    private static final int DIGITS = 6;

    private WorkingText() {}

    /** One step in three lines. */
    record Lines(String name, String formula, String terms, String source) {}

    static List<Lines> of(Working working, UnitSystem units) {
        List<Lines> lines = new ArrayList<>();
        for (Working.Step step : working.steps()) {
            List<String> terms = step.terms().stream()
                    .map(t -> t.symbol() + " = " + Show.value(t.value(), t.kind(), units, DIGITS))
                    .toList();
            lines.add(new Lines(
                    step.name(),
                    step.symbol() + " = " + step.formula() + " = "
                            + Show.value(step.result(), step.kind(), units, DIGITS),
                    String.join(",  ", terms),
                    step.source().text() + "; holds for: " + step.range()));
        }
        return lines;
    }

    static String text(Working working, UnitSystem units) {
        StringBuilder text = new StringBuilder();
        for (Lines step : of(working, units)) {
            text.append(step.name()).append(": ").append(step.formula()).append('\n');
            text.append("    with ").append(step.terms()).append('\n');
            text.append("    ").append(step.source()).append('\n');
        }
        return text.toString();
    }
}
