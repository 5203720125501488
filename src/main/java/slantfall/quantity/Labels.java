package slantfall.quantity;

/**
 * Screen labels from ASCII symbols: exponents raised, micro and degree signs. Written without patterns, because every
 * unit passes here while the program starts.
 */
final class Labels {

    private Labels() {
    }

    /** The label of a symbol; the plain "1" of a dimensionless quantity has none. */
    static String of(String symbol) {
        if (symbol.equals("1")) {
            return "";
        }
        StringBuilder label = new StringBuilder();
        for (int i = 0; i < symbol.length(); i++) {
            label.append(exponent(symbol, i) ? (symbol.charAt(i) == '2' ? '²' : '³') : symbol.charAt(i));
        }
        if (symbol.startsWith("um") || symbol.startsWith("uPa")) {
            label.setCharAt(0, 'µ');
        }
        int degree = label.indexOf("deg");
        if (degree >= 0) {
            label.replace(degree, degree + "deg".length(), "°");
        }
        int imperial = label.indexOf("impgal");
        if (imperial >= 0) {
            label.insert(imperial + "imp".length(), ' ');
        }
        return label.toString();
    }

    private static boolean exponent(String symbol, int i) {
        char c = symbol.charAt(i);
        return (c == '2' || c == '3') && i > 0 && Character.isLetter(symbol.charAt(i - 1));
    }
}
