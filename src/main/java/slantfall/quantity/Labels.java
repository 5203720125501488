package slantfall.quantity;

/** Screen labels from ASCII symbols: exponents raised, micro and degree signs. */
final class Labels {

    private Labels() {
    }

    /** The label of a symbol; the plain "1" of a dimensionless quantity has none. */
    static String of(String symbol) {
        if (symbol.equals("1")) {
            return "";
        }
        return symbol
                .replaceAll("(?<=[a-z])2(?![0-9A-Z])", "²")
                .replaceAll("(?<=[a-z])3(?![0-9A-Z])", "³")
                .replaceAll("\\bu(?=m\\b|Pa\\b)", "µ")
                .replaceAll("\\bdeg(?=[CF]\\b|Bx\\b|$)", "°");
    }
}
