package slantfall.bench.plot;

import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import slantfall.bench.model.Desk;
import slantfall.declare.Declaration;
import slantfall.declare.Evaluator;
import slantfall.declare.Scale;
import slantfall.declare.Setting;
import slantfall.declare.SetUp;

/** What a dragged reading means for the setting that answers: halving of the usual range, on the setting's own scale. */
final class Pull {

    private static final int HALVINGS = 60;

    private Pull() {}

    /**
     * The value of a setting at which a reading takes a wanted value.
     *
     * @param reading key of the reading
     * @param wanted its wanted value [SI]
     * @param by the setting that answers
     * @return value of the setting [SI], the nearer end of its usual range if the reading cannot be reached, empty if
     *     it is unknown there
     */
    static OptionalDouble answer(Desk desk, String reading, double wanted, Setting by) {
        SetUp setUp = desk.session().current();
        Declaration declaration = desk.session().declaration();
        Evaluator evaluator = desk.session().arrangement().evaluator(setUp.structure());
        double[] in = setUp.coordinates(declaration);
        double[] out = new double[declaration.outputs()];
        int place = declaration.coordinates().indexOf(by);
        int read = declaration.readingIndex(reading);
        return solve(by, value -> {
            in[place] = value;
            evaluator.at(in, out);
            return out[read] - wanted;
        });
    }

    private static OptionalDouble solve(Setting by, DoubleUnaryOperator excess) {
        double low = by.usual().low();
        double high = by.usual().high();
        double atLow = excess.applyAsDouble(low);
        double atHigh = excess.applyAsDouble(high);
        if (Double.isNaN(atLow) || Double.isNaN(atHigh)) {
            return OptionalDouble.empty();
        }
        if (atLow * atHigh > 0) {
            return OptionalDouble.of(Math.abs(atLow) < Math.abs(atHigh) ? low : high);
        }
        boolean log = by.scale() == Scale.LOG;
        for (int i = 0; i < HALVINGS; i++) {
            double middle = log ? Math.sqrt(low * high) : (low + high) / 2;
            boolean below = excess.applyAsDouble(middle) * atLow > 0;
            low = below ? middle : low;
            high = below ? high : middle;
        }
        return OptionalDouble.of(log ? Math.sqrt(low * high) : (low + high) / 2);
    }
}
