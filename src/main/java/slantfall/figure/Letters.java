package slantfall.figure;

/**
 * Widths of letters where no font can be asked, as parts of the letter height. Deliberately those of a wide sans-serif, so
 * that labels stay apart in whichever font the picture is opened with. Rounded up by eye from common fonts; no font's table.
 */
final class Letters {

    private static final double NARROW = 0.34;
    private static final double SLIM = 0.42;
    private static final double PLAIN = 0.64;
    private static final double CAPITAL = 0.74;
    private static final double BROAD = 0.98;
    private static final double SIGN = 0.84;
    private static final double BOLD = 1.11;

    private Letters() {}

    /**
     * Width of a line of text.
     *
     * @param size letter height [px]
     */
    static double width(String text, double size, boolean bold) {
        double sum = 0;
        for (int i = 0; i < text.length(); i++) {
            sum += of(text.charAt(i));
        }
        return sum * size * (bold ? BOLD : 1);
    }

    private static double of(char c) {
        if (" ijl.,:;'|!I".indexOf(c) >= 0) {
            return NARROW;
        }
        if ("ftr()[]-/⁰¹²³⁴⁵⁶⁷⁸⁹⁻".indexOf(c) >= 0) {
            return SLIM;
        }
        if ("mwMW…—".indexOf(c) >= 0) {
            return BROAD;
        }
        if ("+−×≤≥=<>%●◐✕○∞".indexOf(c) >= 0) {
            return SIGN;
        }
        return Character.isUpperCase(c) ? CAPITAL : PLAIN;
    }
}
