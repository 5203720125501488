package slantfall.quantity;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads lengths that tubes are given by: inside and outside diameter, wall gauge, fractions of an inch. */
final class TubeReader {

    private static final Pattern GAUGE = Pattern.compile(
            "(.*?) ?(?:od|o\\.d\\.)?[ x*,]+([0-9]{1,2}) ?(?:bwg|ga\\.? bwg)", Pattern.CASE_INSENSITIVE);
    private static final Pattern INSIDE = Pattern.compile(
            "(.*?[^ ]) ?(?:\\b|(?<=[\"']))(?:id|i\\.d\\.|inside(?: diameter)?)", Pattern.CASE_INSENSITIVE);
    private static final Pattern OUTSIDE = Pattern.compile(
            "(.*?[^ ]) ?(?:\\b|(?<=[\"']))(?:od|o\\.d\\.|outside(?: diameter)?)", Pattern.CASE_INSENSITIVE);
    private static final Pattern FRACTION = Pattern.compile(
            "([+-]?)(?:([0-9]{1,4})[ -])?([0-9]{1,3}) ?/ ?([0-9]{1,3}) ?(in|inch|inches|\"|ft|feet|')",
            Pattern.CASE_INSENSITIVE);

    private TubeReader() {
    }

    static Optional<Entry> read(Typed typed) {
        Matcher gauge = GAUGE.matcher(typed.clean());
        if (gauge.matches()) {
            return Optional.of(gauged(typed, gauge));
        }
        if (OUTSIDE.matcher(typed.clean()).matches()) {
            throw typed.refused("is an outside diameter; lengths here are what the liquid sees",
                    "Give the inside diameter (47.5 mm ID), or the outside diameter with the wall gauge "
                    + "(1.5 in x 16 BWG)");
        }
        Matcher inside = INSIDE.matcher(typed.clean());
        if (inside.matches()) {
            Entry plain = plain(typed.as(inside.group(1)));
            return Optional.of(typed.entry(plain.si(), plain.unit(), plain.echo() + ", inside diameter"));
        }
        return FRACTION.matcher(typed.clean()).matches() ? Optional.of(plain(typed)) : Optional.empty();
    }

    /** A length without the words of tubes; fractions of an inch are read. */
    static Entry plain(Typed typed) {
        Matcher m = FRACTION.matcher(typed.clean());
        if (!m.matches()) {
            return LinearReader.read(typed);
        }
        int below = Integer.parseInt(m.group(4));
        if (below == 0) {
            throw typed.refused("divides by zero", "Type the length as a decimal number");
        }
        double whole = m.group(2) == null ? 0 : Integer.parseInt(m.group(2));
        double size = whole + Integer.parseInt(m.group(3)) / (double) below;
        double value = m.group(1).equals("-") ? -size : size;
        return LinearReader.read(typed.as(value + " " + m.group(5)));
    }

    private static Entry gauged(Typed typed, Matcher m) {
        Entry outside = plain(typed.as(m.group(1)));
        int gauge = Integer.parseInt(m.group(2));
        double wall = WireGauge.wall(gauge);
        if (Double.isNaN(wall)) {
            throw typed.refused("names a wall gauge that is not in the table", "Birmingham wire gauges here run from "
                    + "0 to " + WireGauge.LAST);
        }
        double inside = outside.si() - 2 * wall;
        if (!(inside > 0)) {
            throw typed.refused("has a wall thicker than the tube", "Check the diameter and the gauge");
        }
        return typed.entry(inside, outside.unit(), Show.trimmed(inside * 1000, LinearReader.ECHO_DIGITS)
                + " mm inside diameter, from " + outside.echo() + " outside less two walls of "
                + Show.trimmed(wall * 1000, LinearReader.ECHO_DIGITS) + " mm (" + gauge + " BWG)");
    }
}
