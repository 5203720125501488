package slantfall.declare;

import slantfall.quantity.Kind;

/**
 * A number that the user chooses.
 *
 * @param key stable key used by files, {@code --set}, sliders and questions
 * @param name words for people
 * @param symbol symbol used in formulas
 * @param kind kind of quantity
 * @param initial value taken where the user gave none [SI]
 * @param possible outside it a value is refused
 * @param usual outside it a value is computed, with a notice; also the slider's range
 * @param scale linear or logarithmic slider
 * @param help one sentence: meaning and sign
 * @param question key of the one question that uses it, empty if the assessment itself does
 * @param follows key of the setting whose value it takes while untouched, empty if none
 */
public record Setting(
        String key,
        String name,
        String symbol,
        Kind kind,
        double initial,
        Interval possible,
        Interval usual,
        Scale scale,
        String help,
        String question,
        String follows) {

    public Setting {
        if (!possible.contains(usual.low()) && !usual.lowOpen() || !(usual.high() <= possible.high())) {
            throw new IllegalArgumentException(key + ": usual range must lie inside the possible range");
        }
        if (!possible.contains(initial)) {
            throw new IllegalArgumentException(key + ": initial value " + initial + " is not possible");
        }
        if (scale == Scale.LOG && !(usual.low() > 0)) {
            throw new IllegalArgumentException(key + ": a logarithmic setting needs a positive usual range");
        }
    }

    /** A setting that the assessment itself uses. */
    public static Setting of(String key, String name, String symbol, Kind kind, Range range, String help) {
        return new Setting(
                key, name, symbol, kind, range.initial(), range.possible(), range.usual(), range.scale(), help, "",
                "");
    }

    /** The same setting with another initial value and usual range, for an arrangement that needs its own. */
    public Setting startingAt(double newInitial) {
        return new Setting(key, name, symbol, kind, newInitial, possible, usual, scale, help, question, follows);
    }

    /** Marks the setting as one that only the named question uses. */
    public Setting forQuestion(String questionKey) {
        return new Setting(key, name, symbol, kind, initial, possible, usual, scale, help, questionKey, follows);
    }

    /** Takes the value of another setting while the user has given none. */
    public Setting following(String other) {
        return new Setting(key, name, symbol, kind, initial, possible, usual, scale, help, question, other);
    }

    /** Whether the assessment itself uses it. */
    public boolean inAssessment() {
        return question.isEmpty();
    }

    /**
     * The numbers of a setting, apart from its words.
     *
     * @param initial value taken where the user gave none [SI]
     * @param possible refused outside
     * @param usual noticed outside; slider range
     * @param scale slider scale
     */
    public record Range(double initial, Interval possible, Interval usual, Scale scale) {

        /** Linear. */
        public static Range linear(double initial, Interval possible, double usualLow, double usualHigh) {
            return new Range(initial, possible, Interval.closed(usualLow, usualHigh), Scale.LINEAR);
        }

        /** Logarithmic. */
        public static Range log(double initial, Interval possible, double usualLow, double usualHigh) {
            return new Range(initial, possible, Interval.closed(usualLow, usualHigh), Scale.LOG);
        }
    }
}
