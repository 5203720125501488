package slantfall.declare;

import java.util.List;
import java.util.Optional;
import slantfall.quantity.Kind;

/**
 * Readings along an axis: traverses across the film or gap, or courses along the length.
 *
 * @param axis the axis: distance from the lower wall or from the inlet
 * @param place where it was taken: for traverses the distance from the inlet [m], else NaN
 * @param columns the readings, as long as the axis; NaN where a reading is unknown
 */
public record Profile(Column axis, double place, List<Column> columns) {

    public Profile {
        columns = List.copyOf(columns);
        for (Column column : columns) {
            if (column.values().length != axis.values().length) {
                throw new IllegalArgumentException(column.key() + " is not as long as its axis");
            }
        }
    }

    /** A profile with no column, for an arrangement that has none. */
    public static Profile none() {
        return new Profile(new Column("x", "Distance", Kind.LENGTH, new double[0]), Double.NaN, List.of());
    }

    /** The column of a key, if there is one. */
    public Optional<Column> column(String key) {
        return columns.stream().filter(c -> c.key().equals(key)).findFirst();
    }

    /**
     * One reading along the axis.
     *
     * @param key stable key
     * @param name words for people
     * @param kind kind of quantity
     * @param values values [SI]; not to be changed by the receiver
     */
    public record Column(String key, String name, Kind kind, double[] values) {}
}
