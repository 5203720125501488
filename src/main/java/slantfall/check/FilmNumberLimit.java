package slantfall.check;

import java.util.function.Predicate;
import slantfall.declare.Check;
import slantfall.declare.CheckInfo;
import slantfall.declare.Side;
import slantfall.quantity.Kind;
import slantfall.source.Source;

/**
 * A regime limit of the form Re ≤ c Ka_f^e, on the author's own Reynolds number; e = 0 for a plain number.
 *
 * @param info words and source
 * @param multiple the author's Reynolds number over Γ/μ
 * @param coefficient c
 * @param exponent e
 * @param range whether a case lies where the limit was tested
 */
public record FilmNumberLimit(
        CheckInfo info, double multiple, double coefficient, double exponent, Predicate<FilmCase> range)
        implements Check<FilmCase> {

    /** A limit on the Reynolds number of the given kind. */
    static FilmNumberLimit of(
            CheckInfo.Criterion words, Kind kind, Law law, Predicate<FilmCase> range, Source source) {
        return new FilmNumberLimit(
                CheckInfo.log(words, kind, Side.AT_MOST, source),
                Reynolds.multiple(kind),
                law.coefficient(),
                law.exponent(),
                range);
    }

    @Override
    public double value(FilmCase c) {
        return multiple * c.reynolds();
    }

    @Override
    public double limit(FilmCase c) {
        return exponent == 0 ? coefficient : coefficient * Math.pow(c.filmNumber(), exponent);
    }

    @Override
    public boolean inRange(FilmCase c) {
        return range.test(c);
    }

    /** c and e. */
    record Law(double coefficient, double exponent) {}
}
