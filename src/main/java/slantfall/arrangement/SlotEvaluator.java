package slantfall.arrangement;

import java.util.List;
import slantfall.check.SlotCase;
import slantfall.check.SlotPanels;
import slantfall.declare.Check;
import slantfall.declare.Evaluator;
import slantfall.declare.Structure;
import slantfall.flow.Physics;
import slantfall.flow.duct.RectangularDuct;
import slantfall.flow.slot.NewtonianSlot;
import slantfall.flow.slot.SlotEntry;
import slantfall.flow.slot.TaperedSlot;
import slantfall.liquid.Liquid;
import slantfall.liquid.LiquidState;

/** Readings and margins of a closed slot. */
final class SlotEvaluator implements Evaluator {

    private static final List<Check<SlotCase>> CHECKS = SlotPanels.CHECKS;
    private static final int READINGS = 13;
    private static final int SETTINGS = 8;

    private final Liquid.Evaluator liquid;
    private final LiquidState state = new LiquidState();
    private SlotPoint point;
    private SlotCase slotCase;

    SlotEvaluator(Structure structure) {
        liquid = structure.liquid().evaluator(ClosedSlot.FACE.uses());
    }

    SlotPoint point() {
        return point;
    }

    SlotCase slotCase() {
        return slotCase;
    }

    LiquidState state() {
        return state;
    }

    @Override
    public void at(double[] in, double[] out) {
        liquid.at(in, SETTINGS, state);
        TaperedSlot.Shape shape = new TaperedSlot.Shape(in[1], in[2], in[4]);
        point = solve(new SlotPoint.Inputs(in[0], shape, in[3], in[5], in[6], in[7]), state);
        readings(out);
        for (int i = 0; i < CHECKS.size(); i++) {
            out[READINGS + i] = CHECKS.get(i).margin(slotCase);
        }
    }

    /** Flow with and without side walls. */
    static SlotPoint solve(SlotPoint.Inputs in, LiquidState state) {
        double rho = state.density;
        double mu = state.viscosity;
        double weight = rho * Physics.G * Math.sin(in.angle());
        TaperedSlot.Shape shape = in.shape();
        double driving = in.pressureDrop() + weight * shape.length();
        double wide;
        double walled;
        double factor;
        if (shape.inlet() == shape.outlet()) {
            double b = shape.inlet();
            double gradient = driving / shape.length();
            factor = RectangularDuct.flowFactor(b / in.width());
            wide = NewtonianSlot.flow(gradient, mu, b, in.wallSpeed());
            walled = NewtonianSlot.flow(gradient, mu, b, 0) * factor
                    + in.wallSpeed() * b / 2 * RectangularDuct.dragFactor(b / in.width());
        } else {
            double resistance = TaperedSlot.resistance(shape, in.width());
            double wideResistance = wideResistance(shape);
            factor = wideResistance / resistance;
            wide = TaperedSlot.flow(driving, mu, shape, in.wallSpeed());
            double wall = in.wallSpeed() == 0 ? 0 : 6 * mu * in.wallSpeed() * TaperedSlot.drag(shape, in.width());
            walled = (driving / shape.length() + wall) / (12 * mu * resistance);
        }
        return new SlotPoint(in, rho, mu, weight, wide, walled * in.width(), factor);
    }

    /** ⟨1/b³⟩ along the slot [1/m³]. */
    private static double wideResistance(TaperedSlot.Shape shape) {
        double b1 = shape.inlet();
        double b2 = shape.outlet();
        return (b1 + b2) / (2 * b1 * b1 * b2 * b2);
    }

    private void readings(double[] out) {
        SlotPoint p = point;
        TaperedSlot.Shape shape = p.inputs().shape();
        double reynolds = p.reynolds();
        double lowest = p.lowestPressure();
        out[0] = p.flow();
        out[1] = p.flowPerWidth();
        out[2] = p.meanVelocity();
        out[3] = p.maxVelocity();
        out[4] = p.wallStress(true);
        out[5] = p.wallStress(false);
        out[6] = reynolds;
        out[7] = p.flow() == 0 ? Double.NaN : shape.length() * shape.mean() * p.inputs().width() / Math.abs(p.flow());
        out[8] = p.flowing() ? SlotEntry.chen(reynolds) * 2 * shape.inlet() : Double.NaN;
        out[9] = p.entryLoss();
        out[10] = lowest;
        out[11] = p.sideWallFactor();
        out[12] = p.viscousRise(state.conductivity);
        slotCase = new SlotCase(
                reynolds,
                shape.inlet(),
                shape.outlet(),
                shape.length(),
                p.sideWallFactor(),
                lowest,
                state.vapourPressure,
                p.onwardness());
    }
}
