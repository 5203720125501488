package slantfall.arrangement;

import java.util.ArrayList;
import java.util.List;
import slantfall.arrangement.Steps.Names;
import slantfall.declare.Working;
import slantfall.flow.Physics;
import slantfall.flow.duct.RectangularDuct;
import slantfall.flow.slot.SlotEntry;
import slantfall.flow.slot.TaperedSlot;
import slantfall.liquid.LiquidState;
import slantfall.quantity.Kind;
import slantfall.source.Mark;
import slantfall.source.Source;

/** The steps behind the readings of a slot. Readings that are unknown have none. */
final class SlotWorkings {

    private static final Source DEFINITION = Source.of("definition", "definition", Mark.COMPUTED);
    private static final Source COUETTE =
            Source.of("couette-poiseuille", "Couette and Poiseuille flow, exact", Mark.COMPUTED);
    private static final Source REYNOLDS =
            Source.of("reynolds-1886", "Reynolds 1886, Phil. Trans. 177, 157, integrated here", Mark.COMPUTED);
    private static final Source DUCT = Source.of(
            "shah-london-1978", "exact duct series, Shah and London 1978, derived again here", Mark.COMPUTED);
    private static final Source LOSS = new Source(
            "shah-london-1978", "Shah and London 1978; plates 24/35 by Lundgren, Sparrow and Starr 1964", "polynomial in b/W",
            Mark.SECOND_HAND);
    private static final Source CHEN = Source.of("chen-1973", "Chen 1973, J. Fluids Eng. 95, 153", Mark.FROM_MEMORY);
    private static final String LAMINAR = "developed laminar flow";

    private final SlotPoint p;
    private final SlotPoint.Inputs in;
    private final TaperedSlot.Shape shape;

    private SlotWorkings(SlotPoint p) {
        this.p = p;
        this.in = p.inputs();
        this.shape = in.shape();
    }

    static List<Working> of(SlotPoint p, LiquidState state) {
        SlotWorkings w = new SlotWorkings(p);
        List<Working> all = new ArrayList<>();
        all.add(w.flowPerWidth().of("flowPerWidth"));
        all.add(w.sideWalls().of("sideWallFactor"));
        all.add(w.flow().of("flow"));
        all.add(w.meanVelocity().of("meanVelocity"));
        all.add(w.maxVelocity());
        all.add(w.stress(true));
        all.add(w.stress(false));
        all.add(w.reynolds().of("slotReynolds"));
        all.add(w.entryLoss().of("entryLoss"));
        all.add(w.lowestPressure());
        if (p.flow() != 0) {
            all.add(w.residence());
            all.add(w.entryLength());
        }
        if (!Double.isNaN(state.conductivity)) {
            all.add(w.heating(state.conductivity));
        }
        return all;
    }

    private Steps driving() {
        return new Steps()
                .with("Δp", in.pressureDrop(), Kind.PRESSURE_DIFFERENCE)
                .with("ρ", p.density(), Kind.DENSITY)
                .with("g", Physics.G, Kind.ACCELERATION)
                .with("L", shape.length(), Kind.LENGTH)
                .with("β", in.angle(), Kind.ANGLE)
                .gives(new Names("Driving pressure", "P", Kind.PRESSURE_DIFFERENCE), "Δp + ρ g L sin β", p.driving(),
                        COUETTE, "any");
    }

    private Steps common(Steps steps) {
        return steps.with("P", p.driving(), Kind.PRESSURE_DIFFERENCE)
                .with("b_1", shape.inlet(), Kind.LENGTH)
                .with("b_2", shape.outlet(), Kind.LENGTH)
                .with("L", shape.length(), Kind.LENGTH)
                .with("μ", p.viscosity(), Kind.VISCOSITY)
                .with("U", in.wallSpeed(), Kind.VELOCITY);
    }

    private Steps flowPerWidth() {
        Names q = new Names("Flow per width", "q", Kind.VOLUME_FLOW_PER_WIDTH);
        Steps steps = common(driving());
        return p.tapered()
                ? steps.gives(q, "[P + 6μUL/(b_1 b_2)] b_1² b_2²/[6μL(b_1 + b_2)]", p.flowPerWidth(), REYNOLDS,
                        "slow taper, laminar")
                : steps.gives(q, "(P/L) b_1³/(12μ) + U b_1/2", p.flowPerWidth(), COUETTE, LAMINAR);
    }

    private Steps sideWalls() {
        String formula = p.tapered() ? "⟨b⁻³⟩/⟨b⁻³/F(b/W)⟩ along the slot" : "1 − (192a/π⁵) Σ_odd tanh(nπ/2a)/n⁵, a = b_1/W";
        return new Steps()
                .with("b_1", shape.inlet(), Kind.LENGTH)
                .with("b_2", shape.outlet(), Kind.LENGTH)
                .with("W", in.width(), Kind.LENGTH)
                .gives(new Names("Side-wall factor", "F", Kind.RATIO), formula, p.sideWallFactor(), DUCT, "laminar, any aspect");
    }

    private Steps flow() {
        Steps steps = driving()
                .with("b_1", shape.inlet(), Kind.LENGTH)
                .with("b_2", shape.outlet(), Kind.LENGTH)
                .with("W", in.width(), Kind.LENGTH)
                .gives(new Names("Side-wall factor", "F", Kind.RATIO), "exact duct series", p.sideWallFactor(), DUCT,
                        "laminar, any aspect")
                .with("F", p.sideWallFactor(), Kind.RATIO)
                .with("W", in.width(), Kind.LENGTH);
        double drag = RectangularDuct.dragFactor(shape.inlet() / in.width());
        Names flow = new Names("Flow", "Q", Kind.VOLUME_FLOW);
        return p.tapered()
                ? common(steps).gives(flow, "W [P/L + 6μU⟨F_d/(b²F)⟩]/[12μ⟨1/(b³F)⟩]", p.flow(), REYNOLDS, "slow taper")
                : common(steps).with("F_d", drag, Kind.RATIO)
                        .gives(flow, "W [(P/L) b_1³ F/(12μ) + U b_1 F_d/2]", p.flow(), DUCT, LAMINAR);
    }

    private Steps meanVelocity() {
        return flow()
                .with("Q", p.flow(), Kind.VOLUME_FLOW)
                .with("W", in.width(), Kind.LENGTH)
                .with("b_1", shape.inlet(), Kind.LENGTH)
                .gives(new Names("Mean velocity", "u_m", Kind.VELOCITY), "Q/(W b_1)", p.meanVelocity(), DEFINITION, "any");
    }

    private Steps local(Steps steps) {
        return steps.with("q", p.flowPerWidth(), Kind.VOLUME_FLOW_PER_WIDTH)
                .with("b_1", shape.inlet(), Kind.LENGTH)
                .with("b_2", shape.outlet(), Kind.LENGTH)
                .with("μ", p.viscosity(), Kind.VISCOSITY)
                .with("U", in.wallSpeed(), Kind.VELOCITY);
    }

    private Working maxVelocity() {
        return local(flowPerWidth())
                .gives(new Names("Largest velocity", "u_max", Kind.VELOCITY),
                        "largest of u = G y(b − y)/(2μ) + U y/b, G = 12μ(q − Ub/2)/b³, at either end", p.maxVelocity(), COUETTE,
                        LAMINAR)
                .of("maxVelocity");
    }

    private Working stress(boolean lower) {
        Names names = lower
                ? new Names("Stress at the lower wall", "τ_1", Kind.STRESS)
                : new Names("Stress at the upper wall", "τ_2", Kind.STRESS);
        String formula = lower ? "6μq/b² − 2μU/b where it is largest" : "−6μq/b² + 4μU/b where it is largest";
        return local(flowPerWidth())
                .gives(names, formula, p.wallStress(lower), COUETTE, LAMINAR)
                .of(lower ? "wallShearLower" : "wallShearUpper");
    }

    private Steps reynolds() {
        return flowPerWidth()
                .with("q", p.flowPerWidth(), Kind.VOLUME_FLOW_PER_WIDTH)
                .with("ρ", p.density(), Kind.DENSITY)
                .with("μ", p.viscosity(), Kind.VISCOSITY)
                .gives(new Names("Slot Reynolds number", "Re", Kind.REYNOLDS_SLOT), "2|q| ρ/μ", p.reynolds(), DEFINITION,
                        "on D_h = 2b");
    }

    private Working entryLength() {
        return reynolds()
                .with("Re", p.reynolds(), Kind.REYNOLDS_SLOT)
                .with("b_1", shape.inlet(), Kind.LENGTH)
                .gives(new Names("Entry length", "L_e", Kind.LENGTH), "2b_1 [0.315/(0.0175 Re + 1) + 0.011 Re]",
                        SlotEntry.chen(p.reynolds()) * 2 * shape.inlet(), CHEN, "laminar, flat inlet profile")
                .of("entryLength");
    }

    private Steps entryLoss() {
        double gap = p.flow() >= 0 ? shape.inlet() : shape.outlet();
        return flow()
                .with("Q", p.flow(), Kind.VOLUME_FLOW)
                .with("b_e", gap, Kind.LENGTH)
                .with("W", in.width(), Kind.LENGTH)
                .with("ρ", p.density(), Kind.DENSITY)
                .with("K_∞", RectangularDuct.entryLossNumber(gap / in.width()), Kind.RATIO)
                .gives(new Names("Entry loss", "Δp_e", Kind.PRESSURE_DIFFERENCE), "(1 + K_∞) ρ (Q/(W b_e))²/2, b_e the gap at the mouth", p.entryLoss(),
                        LOSS, "laminar, flat inlet profile, the slot longer than the entry length");
    }

    private Working lowestPressure() {
        return entryLoss()
                .with("p_2", in.outletPressure(), Kind.PRESSURE_ABSOLUTE)
                .with("Δp", in.pressureDrop(), Kind.PRESSURE_DIFFERENCE)
                .with("Δp_e", p.entryLoss(), Kind.PRESSURE_DIFFERENCE)
                .gives(new Names("Lowest pressure inside", "p_min", Kind.PRESSURE_ABSOLUTE),
                        "smaller of p at the mouth − Δp_e and the least of p(x), dp/dx = ρ g sin β + 6μU/b² − 12μq/b³",
                        p.lowestPressure(), REYNOLDS, "slow taper, laminar")
                .of("lowestPressure");
    }

    private Working residence() {
        return flow()
                .with("L", shape.length(), Kind.LENGTH)
                .with("b_m", shape.mean(), Kind.LENGTH)
                .with("W", in.width(), Kind.LENGTH)
                .with("Q", p.flow(), Kind.VOLUME_FLOW)
                .gives(new Names("Mean residence time", "t_m", Kind.TIME), "L b_m W/|Q|",
                        shape.length() * shape.mean() * in.width() / Math.abs(p.flow()), DEFINITION, "any")
                .of("residenceMean");
    }

    private Working heating(double conductivity) {
        return local(flowPerWidth())
                .with("k", conductivity, Kind.CONDUCTIVITY)
                .gives(new Names("Viscous heating", "ΔT", Kind.TEMPERATURE_DIFFERENCE),
                        "largest T of k T″ = −μ(du/dy)², both walls at one temperature", p.viscousRise(conductivity), COUETTE,
                        "constant viscosity, developed temperature")
                .of("viscousHeating");
    }
}
