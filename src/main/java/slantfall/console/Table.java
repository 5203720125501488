package slantfall.console;

import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.List;

/** Columns padded to their widest cell. */
final class Table {

    private final List<List<String>> rows = new ArrayList<>();

    void row(String... cells) {
        rows.add(List.of(cells));
    }

    boolean isEmpty() {
        return rows.isEmpty();
    }

    void print(PrintWriter out, String indent) {
        int columns = rows.stream().mapToInt(List::size).max().orElse(0);
        int[] widths = new int[columns];
        for (List<String> row : rows) {
            for (int i = 0; i < row.size(); i++) {
                widths[i] = Math.max(widths[i], row.get(i).codePointCount(0, row.get(i).length()));
            }
        }
        for (List<String> row : rows) {
            StringBuilder line = new StringBuilder(indent);
            for (int i = 0; i < row.size(); i++) {
                String cell = row.get(i);
                line.append(cell);
                if (i < row.size() - 1) {
                    line.append(" ".repeat(widths[i] - cell.codePointCount(0, cell.length()) + 2));
                }
            }
            out.println(line.toString().stripTrailing());
        }
    }
}
