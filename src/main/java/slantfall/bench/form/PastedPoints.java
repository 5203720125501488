package slantfall.bench.form;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import slantfall.liquid.ViscosityFit;
import slantfall.quantity.EntryContext;
import slantfall.quantity.EntryReader;
import slantfall.quantity.Kind;

/**
 * Viscosity points pasted as a table: one point a line, temperature and viscosity apart by a tab, a semicolon or spaces. A
 * number may bring its unit; one without takes the unit given for its column. A first line without a digit is a heading.
 *
 * @param points temperatures and viscosities [SI]
 * @param typed the same as they go into the file
 */
record PastedPoints(List<ViscosityFit.Point> points, List<List<String>> typed) {

    /** A number with whatever follows it up to the next number that stands after a space. */
    private static final Pattern CELL =
            Pattern.compile("\\s*([+\\-−]?[\\d.,]+(?:[eE][+\\-−]?\\d+)?(?:\\s*[^\\d\\s;+\\-−][^;\\d]*)?)\\s*");

    /**
     * Reads a table.
     *
     * @param temperatureUnit unit of temperatures that bring none
     * @param viscosityUnit unit of viscosities that bring none
     * @throws IllegalArgumentException naming the line; {@link slantfall.quantity.QuantityProblem} for a number
     */
    static PastedPoints read(String table, String temperatureUnit, String viscosityUnit, EntryContext context) {
        List<ViscosityFit.Point> points = new ArrayList<>();
        List<List<String>> typed = new ArrayList<>();
        String[] lines = table.strip().split("\\R");
        for (int i = 0; i < lines.length; i++) {
            String line = lines[i].strip();
            boolean heading = i == 0 && line.chars().noneMatch(Character::isDigit);
            if (line.isEmpty() || heading) {
                continue;
            }
            List<String> cells = cells(line);
            if (cells.size() != 2) {
                throw new IllegalArgumentException("Line " + (i + 1) + " has " + cells.size()
                        + (cells.size() == 1 ? " number" : " numbers") + "; write a temperature and a viscosity.");
            }
            String t = withUnit(cells.get(0), temperatureUnit);
            String mu = withUnit(cells.get(1), viscosityUnit);
            points.add(new ViscosityFit.Point(
                    EntryReader.read(t, Kind.TEMPERATURE, context).si(), EntryReader.read(mu, Kind.VISCOSITY, context).si()));
            typed.add(List.of(t, mu));
        }
        if (points.isEmpty()) {
            throw new IllegalArgumentException("Paste one point a line, such as \"20 °C  7.5 Pa s\".");
        }
        return new PastedPoints(List.copyOf(points), List.copyOf(typed));
    }

    private static List<String> cells(String line) {
        List<String> cells = new ArrayList<>();
        if (line.contains("\t") || line.contains(";")) {
            for (String cell : line.split("[\t;]")) {
                if (!cell.isBlank()) {
                    cells.add(cell.strip());
                }
            }
            return cells;
        }
        Matcher matcher = CELL.matcher(line);
        int end = 0;
        while (end < line.length() && matcher.find(end) && matcher.start() == end) {
            cells.add(matcher.group(1).strip());
            end = matcher.end();
        }
        return end == line.length() ? cells : List.of(line);
    }

    private static String withUnit(String cell, String unit) {
        boolean bare = cell.chars().noneMatch(c -> Character.isLetter(c) && c != 'e' && c != 'E' || c == '°');
        return bare ? cell + " " + unit : cell;
    }
}
