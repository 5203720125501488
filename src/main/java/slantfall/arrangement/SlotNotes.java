package slantfall.arrangement;

import java.util.ArrayList;
import java.util.List;
import slantfall.check.Cautions;
import slantfall.declare.Assessor;
import slantfall.declare.SetUp;
import slantfall.flow.Physics;
import slantfall.liquid.LiquidState;
import slantfall.quantity.Kind;
import slantfall.quantity.Show;
import slantfall.quantity.UnitSystem;

/** Sentences that go with a slot. */
final class SlotNotes {

    private static final double TURBULENT = 2300;

    private SlotNotes() {}

    static void add(Assessor assessor, SlotPoint p) {
        SlotPoint.Inputs in = p.inputs();
        if (!p.flowing()) {
            String text = "Nothing drives the slot: pressure, gravity and wall add up to no flow.";
            assessor.notice("residenceMean", text);
            assessor.notice("entryLength", text);
            return;
        }
        if (p.onwardness() < 0) {
            assessor.notice("profile", "Part of the liquid runs against the net flow.");
        }
        if (p.reynolds() > TURBULENT) {
            assessor.notice("flow", "The slot's Reynolds number is beyond 2300: the laminar law used here overstates the"
                    + " flow if it turns turbulent.");
        }
        double ends = Math.min(p.inletPressure(), in.outletPressure());
        double below = ends - p.lowestPressure();
        if (below > 1e-9 * Physics.ATMOSPHERE) {
            assessor.notice("lowestPressure", "The pressure inside falls " + show(below) + " below that at both ends: air can"
                    + " be drawn in at a joint, dissolved gas comes out.");
        }
        if (p.lowestPressure() < 0) {
            assessor.notice("lowestPressure", "The lowest pressure comes out below absolute zero: the slot cannot run full"
                    + " like this; raise the outlet pressure or lower the flow.");
        }
        if (p.entryLoss() > 0.1 * Math.abs(p.driving())) {
            assessor.notice("entryLoss", "The entry loss is more than a tenth of what drives the slot and is not taken from"
                    + " the flow: the real flow is smaller.");
        }
    }

    static List<String> cautions(SlotPoint p, LiquidState state, SetUp setUp) {
        List<String> cautions = new ArrayList<>(Cautions.ofLiquid(state.temperature, setUp.base().preset()));
        double gauge = Math.max(
                Math.abs(p.inputs().pressureDrop()),
                Math.max(p.inletPressure(), p.inputs().outletPressure()) - Physics.ATMOSPHERE);
        cautions.addAll(Cautions.ofPressure(gauge));
        if (p.inputs().wallSpeed() != 0) {
            cautions.add("Moving wall: nips and rotating parts near a lip are a machinery hazard; machinery-safety standards"
                    + " and local rules decide.");
        }
        return cautions;
    }

    private static String show(double pressure) {
        return Show.value(pressure, Kind.PRESSURE_DIFFERENCE, UnitSystem.SI, 3);
    }
}
