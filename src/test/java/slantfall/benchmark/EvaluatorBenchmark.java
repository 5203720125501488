package slantfall.benchmark;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.openjdk.jmh.profile.GCProfiler;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.options.OptionsBuilder;
import slantfall.catalogue.Catalogue;
import slantfall.declare.Arrangement;
import slantfall.declare.Assessment;
import slantfall.declare.Declaration;
import slantfall.declare.Evaluator;
import slantfall.declare.LiquidBase;
import slantfall.declare.SetUp;
import slantfall.declare.Value;
import slantfall.store.Presets;

/** One evaluation with all checks, and one whole assessment. Run by its main method; see docs/performance.md. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class EvaluatorBenchmark {

    @Param({"inclined-film", "closed-slot"})
    public String arrangement;

    /** Measured constants, or water whose temperature changes at every point. */
    @Param({"measured", "water"})
    public String liquid;

    private Evaluator evaluator;
    private double[][] in;
    private double[] out;
    private int next;
    private SetUp setUp;
    private Arrangement subject;

    @Setup
    public void prepare() {
        subject = Catalogue.named(arrangement);
        setUp = liquid.equals("water")
                ? SetUp.blank(arrangement, LiquidBase.of(Presets.load().find("water").orElseThrow()))
                : SetUp.blank(arrangement, LiquidBase.measured())
                        .with("liquid.density", Value.of(1000))
                        .with("liquid.viscosity", Value.of(1e-3))
                        .with("liquid.surfaceTension", Value.of(0.07))
                        .with("liquid.conductivity", Value.of(0.6))
                        .with("liquid.heatCapacity", Value.of(4180))
                        .with("liquid.vapourPressure", Value.of(2300));
        Declaration declaration = subject.declare(setUp.structure());
        evaluator = subject.evaluator(setUp.structure());
        out = new double[declaration.outputs()];
        in = new double[256][];
        for (int i = 0; i < in.length; i++) {
            in[i] = setUp.coordinates(declaration);
            for (int j = 0; j < in[i].length; j++) {
                in[i][j] *= 1 + 1e-4 * i;
            }
        }
    }

    @Benchmark
    public double[] evaluate() {
        evaluator.at(in[next++ & 255], out);
        return out;
    }

    @Benchmark
    public Assessment assess() {
        return subject.assess(setUp);
    }

    public static void main(String[] args) throws Exception {
        new Runner(new OptionsBuilder()
                        .include(EvaluatorBenchmark.class.getSimpleName())
                        .addProfiler(GCProfiler.class)
                        .build())
                .run();
    }
}
