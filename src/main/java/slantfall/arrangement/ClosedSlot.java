package slantfall.arrangement;

import java.util.List;
import java.util.Set;
import slantfall.check.SlotPanels;
import slantfall.declare.Arrangement;
import slantfall.declare.Assessment;
import slantfall.declare.Assessor;
import slantfall.declare.Declaration;
import slantfall.declare.Evaluator;
import slantfall.declare.Interval;
import slantfall.declare.Reading;
import slantfall.declare.SetUp;
import slantfall.declare.Setting;
import slantfall.declare.Setting.Range;
import slantfall.declare.Structure;
import slantfall.liquid.Property;
import slantfall.quantity.Kind;

/** Liquid filling the gap between two walls: pressure, gravity and a sliding upper wall together. */
public final class ClosedSlot implements Arrangement {

    /** Key in files. */
    public static final String KEY = "closed-slot";

    private static final List<Setting> SETTINGS = List.of(
            Setting.of("angle", "Incline", "β", Kind.ANGLE,
                    Range.linear(Math.toRadians(30), Interval.closed(-Math.PI / 2, Math.PI / 2), -Math.PI / 2, Math.PI / 2),
                    "Angle from the horizontal; negative where the outlet lies above the inlet."),
            Setting.of("gap", "Gap", "b", Kind.LENGTH,
                    Range.log(1e-3, Interval.above(0, 1), 5e-5, 0.1), "Distance of the walls at the inlet."),
            Setting.of("gapOutlet", "Gap at the outlet", "b_2", Kind.LENGTH,
                    Range.log(1e-3, Interval.above(0, 1), 5e-5, 0.1), "Distance of the walls at the outlet.")
                    .following("gap"),
            Setting.of("width", "Width", "W", Kind.LENGTH,
                    Range.log(0.4, Interval.above(0, 1000), 0.005, 10), "Width between the side walls."),
            Setting.of("length", "Length", "L", Kind.LENGTH,
                    Range.log(0.5, Interval.above(0, 1000), 0.005, 20), "Length of the slot along the flow."),
            Setting.of("pressureDrop", "Pressure drop", "Δp", Kind.PRESSURE_DIFFERENCE,
                    Range.linear(0, Interval.closed(-1e9, 1e9), -2e5, 2e5), "Static pressure at the inlet minus outlet."),
            Setting.of("outletPressure", "Outlet pressure", "p_2", Kind.PRESSURE_ABSOLUTE,
                    Range.linear(101325, Interval.closed(0, 1e9), 0, 1e6), "Absolute static pressure at the outlet."),
            Setting.of("wallSpeed", "Wall speed", "U", Kind.VELOCITY,
                    Range.linear(0, Interval.closed(-1000, 1000), -5, 5),
                    "Speed of the upper wall in its own plane, positive downhill."));

    private static final List<Reading> READINGS = List.of(
            Reading.signed("flow", "Flow", "Q", Kind.VOLUME_FLOW, 1e-3, "Volume flow with side walls, positive downhill."),
            Reading.signed("flowPerWidth", "Flow per width", "q", Kind.VOLUME_FLOW_PER_WIDTH, 1e-3,
                    "Flow per width of a wide slot, positive downhill."),
            Reading.signed("meanVelocity", "Mean velocity", "u_m", Kind.VELOCITY, 1,
                    "Flow over width and gap at the inlet, side walls in it."),
            Reading.signed("maxVelocity", "Largest velocity", "u_max", Kind.VELOCITY, 1,
                    "Velocity of largest magnitude of the wide slot, signed."),
            Reading.signed("wallShearLower", "Stress at the lower wall", "τ_1", Kind.STRESS, 100,
                    "μ du/dy at the lower wall where it is largest along the slot."),
            Reading.signed("wallShearUpper", "Stress at the upper wall", "τ_2", Kind.STRESS, 100,
                    "μ du/dy at the upper wall where it is largest along the slot; the force on the wall is its negative."),
            Reading.positive("slotReynolds", "Slot Reynolds number 2bu/ν", "Re", Kind.REYNOLDS_SLOT,
                    "On D_h = 2b and the wide slot's mean velocity."),
            Reading.positive("residenceMean", "Mean residence time", "t_m", Kind.TIME, "Volume of the slot over flow."),
            Reading.positive("entryLength", "Entry length", "L_e", Kind.LENGTH, "Length to a developed profile, Chen 1973."),
            Reading.positive("entryLoss", "Entry loss", "Δp_e", Kind.PRESSURE_DIFFERENCE,
                    "Pressure lost at the mouth, (1 + K_∞)ρu_m²/2; not taken from the flow."),
            Reading.positive("lowestPressure", "Lowest pressure inside", "p_min", Kind.PRESSURE_ABSOLUTE,
                    "Lowest absolute pressure along the slot, mouth included."),
            Reading.positive("sideWallFactor", "Side-wall factor", "F", Kind.RATIO,
                    "Pressure- and gravity-driven flow with side walls over that without."),
            Reading.positive("viscousHeating", "Viscous heating", "ΔT", Kind.TEMPERATURE_DIFFERENCE,
                    "Largest rise above two walls of equal temperature."));

    static final Declaration.Face FACE = new Declaration.Face(
            KEY,
            "Closed slot",
            "Liquid filling the gap between two walls, driven by pressure, gravity and a sliding wall.",
            SETTINGS,
            List.of(),
            READINGS,
            SlotPanels.PANELS,
            SlotPanels.CHECKS.stream().map(c -> c.info()).toList(),
            List.of("liquid.temperature", "angle", "gap", "pressureDrop"),
            Set.of(Property.DENSITY, Property.VISCOSITY, Property.CONDUCTIVITY, Property.VAPOUR_PRESSURE));

    @Override
    public String key() {
        return KEY;
    }

    @Override
    public Declaration declare(Structure structure) {
        return Declaration.of(FACE, structure.liquid());
    }

    @Override
    public Evaluator evaluator(Structure structure) {
        return new SlotEvaluator(structure);
    }

    @Override
    public Assessment assess(SetUp setUp) {
        Structure structure = setUp.structure();
        SlotEvaluator evaluator = new SlotEvaluator(structure);
        Assessor assessor = new Assessor(setUp, structure, declare(structure), evaluator);
        SlotPoint point = evaluator.point();
        SlotNotes.add(assessor, point);
        return assessor.checks(SlotPanels.CHECKS, evaluator.slotCase())
                .profiles(SlotProfiles.across(point), SlotProfiles.along(point))
                .workings(SlotWorkings.of(point, evaluator.state()))
                .cautions(SlotNotes.cautions(point, evaluator.state(), setUp))
                .finish(evaluator.state());
    }
}
