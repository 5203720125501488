package slantfall.session;

import slantfall.declare.Arrangement;
import slantfall.declare.Declaration;
import slantfall.declare.Evaluator;
import slantfall.declare.Scale;
import slantfall.declare.SetUp;
import slantfall.declare.Setting;

/** Finds the value of one setting at which a reading has a wanted value, for a reading that is dragged. */
public final class Hold {

    private static final int HALVINGS = 60;
    private static final double WIDEN = 4;

    private Hold() {}

    /**
     * The value of a setting that gives a reading its wanted value, searched outward from the present value.
     *
     * @param reading key of the reading
     * @param wanted wanted value [SI]
     * @param by key of the setting that answers
     * @return the value [SI], NaN where the reading cannot be reached within the possible range
     */
    public static double solve(Arrangement arrangement, SetUp setUp, String reading, double wanted, String by) {
        Declaration declaration = arrangement.declare(setUp.structure());
        Setting setting = declaration.setting(by).orElseThrow(() -> new IllegalArgumentException("no setting " + by));
        return new Search(arrangement, setUp, setting, reading, wanted).run();
    }

    private static final class Search {

        private final Evaluator evaluator;
        private final double[] in;
        private final double[] out;
        private final int place;
        private final int read;
        private final double wanted;
        private final Setting setting;

        Search(Arrangement arrangement, SetUp setUp, Setting setting, String reading, double wanted) {
            Declaration declaration = arrangement.declare(setUp.structure());
            evaluator = arrangement.evaluator(setUp.structure());
            in = setUp.coordinates(declaration);
            out = new double[declaration.outputs()];
            place = declaration.coordinates().indexOf(setting);
            read = declaration.readingIndex(reading);
            this.setting = setting;
            this.wanted = wanted;
        }

        private double miss(double value) {
            in[place] = value;
            evaluator.at(in, out);
            return out[read] - wanted;
        }

        double run() {
            double here = in[place];
            double there = miss(here);
            if (there == 0) {
                return here;
            }
            double floor = setting.scale() == Scale.LOG ? setting.usual().low() * 1e-6 : setting.possible().low();
            double least = Math.max(setting.possible().low(), floor);
            double most = setting.possible().high();
            double up = bracket(here, there, most);
            double down = bracket(here, there, least);
            double end = Double.isNaN(up) || !Double.isNaN(down) && near(down, here) < near(up, here) ? down : up;
            return Double.isNaN(end) ? Double.NaN : halve(here, end, there);
        }

        private double near(double a, double b) {
            return setting.scale() == Scale.LOG ? Math.abs(Math.log(a / b)) : Math.abs(a - b);
        }

        /** The first place outward where the miss has the other sign, NaN if none. */
        private double bracket(double here, double there, double bound) {
            double reach = 0.01;
            for (int i = 0; i < 40; i++) {
                double value = outward(here, bound, Math.min(1, reach));
                double miss = miss(value);
                if (miss * there <= 0) {
                    return value;
                }
                if (reach >= 1) {
                    return Double.NaN;
                }
                reach *= WIDEN;
            }
            return Double.NaN;
        }

        private double outward(double here, double bound, double part) {
            return setting.scale() == Scale.LOG && here > 0 && bound > 0
                    ? here * Math.pow(bound / here, part)
                    : here + (bound - here) * part;
        }

        private double halve(double from, double to, double missFrom) {
            double a = from;
            double b = to;
            for (int i = 0; i < HALVINGS; i++) {
                double middle = setting.scale() == Scale.LOG && a > 0 && b > 0 ? Math.sqrt(a * b) : (a + b) / 2;
                if (miss(middle) * missFrom > 0) {
                    a = middle;
                } else {
                    b = middle;
                }
            }
            return (a + b) / 2;
        }
    }
}
