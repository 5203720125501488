package slantfall.declare;

/**
 * One check applied to a set-up.
 *
 * @param info words, side, scale and source
 * @param verdict what it says
 * @param value the value compared [unit of {@code info.kind()}], NaN if unknown
 * @param limit the limit [unit of {@code info.kind()}], NaN if unknown
 * @param margin signed margin, NaN if unknown
 * @param inRange whether the case lies where the criterion was tested
 * @param note why it is unknown or out of range, empty otherwise
 * @param binding whether a crossing counts against the user's own rules: a requirement or a house rule
 */
public record CheckResult(
        CheckInfo info,
        Verdict verdict,
        double value,
        double limit,
        double margin,
        boolean inRange,
        String note,
        boolean binding) {

    /** Whether it takes part in the panel's phrase and in "tightest". */
    public boolean counts() {
        return inRange && verdict != Verdict.UNKNOWN;
    }
}
