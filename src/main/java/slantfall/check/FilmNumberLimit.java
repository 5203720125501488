package slantfall.check;

import java.util.function.Predicate;
import slantfall.declare.Check;
import slantfall.declare.CheckInfo;
import slantfall.declare.Margin;
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
 * @param logOfLimit ln c less ln of the multiple
 * @param range whether a case lies where the limit was tested
 */
public record FilmNumberLimit(
        CheckInfo info,
        double multiple,
        double coefficient,
        double exponent,
        double logOfLimit,
        Predicate<FilmCase> range)
        implements Check<FilmCase> {

    /** A limit on the Reynolds number of the given kind. */
    static FilmNumberLimit of(
            CheckInfo.Criterion words, Kind kind, Law law, Predicate<FilmCase> range, Source source) {
        return new FilmNumberLimit(
                CheckInfo.log(words, kind, Side.AT_MOST, source),
                Reynolds.multiple(kind),
                law.coefficient(),
                law.exponent(),
                Math.log(law.coefficient() / Reynolds.multiple(kind)),
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

    /** The same as by value and limit, from the logarithms: ln c + e ln Ka_f − ln Re. */
    @Override
    public double margin(FilmCase c) {
        if (c.reynolds() <= 0) {
            return exponent != 0 && Double.isNaN(c.filmNumber()) ? Double.NaN : Margin.CLAMP;
        }
        double ofFilm = exponent == 0 ? 0 : exponent * c.logs().filmNumber();
        return Margin.clamp(logOfLimit + ofFilm - c.logs().reynolds());
    }

    /** c and e. */
    record Law(double coefficient, double exponent) {}
}
