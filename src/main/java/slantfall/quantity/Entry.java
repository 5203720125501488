package slantfall.quantity;

/**
 * An entry that was understood.
 *
 * @param typed what was typed, untouched
 * @param si its value in the coherent SI unit of the kind
 * @param kind the kind of quantity it was read as
 * @param unit the unit it was read in; for entries that no unit describes (slopes, degrees Baumé, tube gauges) the
 *     nearest unit of the kind
 * @param echo what was understood, in full, for people
 */
public record Entry(String typed, double si, Kind kind, Unit unit, String echo) {
}
