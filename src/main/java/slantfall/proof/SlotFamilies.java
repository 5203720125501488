package slantfall.proof;

import java.util.List;
import slantfall.check.SlotCase;
import slantfall.check.SlotPanels;
import slantfall.declare.Check;
import slantfall.flow.duct.RectangularDuct;
import slantfall.flow.slot.NewtonianSlot;
import slantfall.flow.slot.ProfileFactors;
import slantfall.flow.slot.SlotEntry;
import slantfall.flow.slot.TaperedSlot;
import slantfall.flow.slot.TurbulentSlot;

/** Section 5: the closed slot. */
final class SlotFamilies {

    static final List<Family> ALL = List.of(
            Family.one("5.CP.q", "flow per width by pressure, gravity and a moving wall", SlotFamilies::uniform),
            Family.list("5.CP.tau", "μ du/dy at the resting and at the moving wall", in -> new double[] {
                stress(in, 0), stress(in, in.positive("b"))
            }),
            Family.list("5.rect", "f Re (Fanning, on D_h) and flow factor", in -> new double[] {
                RectangularDuct.fanningReynolds(in.positive("a")), RectangularDuct.flowFactor(in.positive("a"))
            }),
            Family.one("5.taper.q", "flow per width of a tapered slot", SlotFamilies::tapered),
            Family.one("5.taper.beq", "uniform gap with the same flow",
                    in -> TaperedSlot.equivalentGap(in.positive("b1"), in.positive("b2"))),
            Family.one("5.trans", "linear limit on D_h", in -> limit("transition.orszag-1971-linear")),
            Family.list("5.Jones", "Darcy friction factor with and without the laminar equivalent", in -> {
                double reynolds = in.positive("Re_Dh");
                double equivalent = TurbulentSlot.laminarEquivalent(in.number("aspect")) * reynolds;
                return new double[] {TurbulentSlot.darcy(equivalent), TurbulentSlot.darcy(reynolds)};
            }),
            Family.list("5.Jones.phi", "laminar equivalent, exact and fitted, at aspect 0, 1, ½", in -> new double[] {
                exact(0), exact(1), exact(0.5), TurbulentSlot.laminarEquivalent(0), TurbulentSlot.laminarEquivalent(1),
                TurbulentSlot.laminarEquivalent(0.5)
            }),
            Family.list("5.ke", "momentum factor, energy factor, entry-loss number", in -> new double[] {
                ProfileFactors.momentum(1, 1, 1, 0), ProfileFactors.energy(1, 1, 1, 0), RectangularDuct.entryLossNumber(0)
            }),
            Family.list("5.Le", "entry length over D_h, Chen and Durst", in -> new double[] {
                SlotEntry.chen(in.number("Re_Dh")), SlotEntry.durst(in.number("Re_Dh"))
            }));

    private SlotFamilies() {}

    /** Δp + ρ g L sin β [Pa]. */
    private static double driving(Inputs in) {
        return in.number("dp") + in.positive("rho") * in.positive("g") * in.positive("L") * Math.sin(in.angle());
    }

    private static double uniform(Inputs in) {
        return NewtonianSlot.flow(driving(in) / in.positive("L"), in.positive("mu"), in.positive("b"), in.number("U"));
    }

    private static double tapered(Inputs in) {
        TaperedSlot.Shape shape = new TaperedSlot.Shape(in.positive("b1"), in.positive("b2"), in.positive("L"));
        return TaperedSlot.flow(driving(in), in.positive("mu"), shape, in.number("U"));
    }

    private static double stress(Inputs in, double place) {
        return NewtonianSlot.stress(in.number("G"), in.positive("mu"), in.positive("b"), in.number("U"), place);
    }

    private static double exact(double aspect) {
        return TurbulentSlot.laminarEquivalentExact(RectangularDuct.fanningReynolds(aspect));
    }

    private static double limit(String key) {
        for (Check<SlotCase> check : SlotPanels.CHECKS) {
            if (check.info().key().equals(key)) {
                return check.limit(new SlotCase(1, 1, 1, 1, 1, 1, 1, 1));
            }
        }
        throw new IllegalStateException("no check " + key + " among the panels of a slot");
    }
}
