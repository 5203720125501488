package slantfall.check;

import java.util.List;
import slantfall.declare.Check;
import slantfall.declare.CheckInfo;
import slantfall.declare.Panel;
import slantfall.declare.Side;
import slantfall.flow.slot.SlotEntry;
import slantfall.quantity.Kind;
import slantfall.source.Mark;
import slantfall.source.Source;

/** The panels of a slot: add a check with one line. */
public final class SlotPanels {

    /** Side walls may take this share before the wide-slot profile is doubtful. */
    private static final double WIDE = 0.05;

    /** Steepest taper for lubrication theory. */
    private static final double SLOW = 0.1;

    private static final Source PRACTICE = Source.of("common-practice", "common practice", Mark.COMMON_PRACTICE);

    /** Every panel of a slot. */
    public static final List<Panel> PANELS = List.of(
            new Panel("transition", "Is the flow in the slot laminar?", "laminar", "not laminar", Panel.Sort.REGIME),
            new Panel("profile", "Does all the liquid run the same way?", "no reversal", "part runs back",
                    Panel.Sort.LIMIT),
            new Panel("boiling", "Does the pressure stay above boiling?", "above boiling", "below boiling",
                    Panel.Sort.LIMIT),
            new Panel("entry", "Is the profile developed before the slot ends?", "developed", "not developed",
                    Panel.Sort.VALIDITY),
            new Panel("wide-slot", "Is the slot wide enough for the flat profile?", "wide", "side walls matter",
                    Panel.Sort.VALIDITY),
            new Panel("slow-taper", "Does the gap change slowly enough?", "slow", "too fast", Panel.Sort.VALIDITY));

    /** Every check of a slot. */
    public static final List<Check<SlotCase>> CHECKS = List.of(
            transition("observed-2300", "Lowest limit in use for ducts", "2b u_m/ν ≤ 2300", 2300, PRACTICE),
            transition("shimomukai-kanda-2006", "Shimomukai and Kanda 2006, lowest computed", "2b u_m/ν ≤ 2600", 2600,
                    new Source("shimomukai-kanda-2006", "Shimomukai and Kanda 2006, ETNA 23, 202",
                            "abstract: 1300 to 1400, read here as on gap and mean velocity", Mark.READ)),
            transition("orszag-1971-linear", "Orszag 1971, linear growth", "2b u_m/ν ≤ 15393", 5772.22 * 2 / 3 * 4,
                    new Source("orszag-1971", "Orszag 1971, J. Fluid Mech. 50, 689",
                            "abstract: 5772.22 on half gap and centre velocity", Mark.READ)),
            new Criterion<>(
                    CheckInfo.linear(
                            new CheckInfo.Criterion("profile", "couette-poiseuille", "Reversal of part of the profile",
                                    "U ≤ 3u_m with the flow, U ≥ 0 against it", "developed laminar flow"),
                            Kind.RATIO,
                            Side.AT_LEAST,
                            1,
                            Source.of("couette-poiseuille", "from the Couette and Poiseuille profile", Mark.COMPUTED)),
                    SlotCase::onwardness,
                    c -> 0,
                    c -> true),
            new Criterion<>(
                    CheckInfo.log(
                            new CheckInfo.Criterion("boiling", "vapour-pressure", "Lowest pressure against vapour pressure",
                                    "p_min ≥ p_v", "pure liquid; dissolved gas comes out earlier"),
                            Kind.PRESSURE_ABSOLUTE,
                            Side.AT_LEAST,
                            Source.of("definition", "definition of the vapour pressure", Mark.COMPUTED)),
                    SlotCase::lowestPressure,
                    SlotCase::vapourPressure,
                    c -> true),
            entry("chen-1973", "Chen 1973", Source.of("chen-1973", "Chen 1973, J. Fluids Eng. 95, 153", Mark.FROM_MEMORY),
                    c -> SlotEntry.chen(c.reynolds()) * 2 * c.gapInlet()),
            entry("durst-2005", "Durst et al. 2005",
                    Source.of("durst-2005", "Durst et al. 2005, J. Fluids Eng. 127, 1154", Mark.FROM_MEMORY),
                    c -> SlotEntry.durst(c.reynolds()) * 2 * c.gapInlet()),
            new Criterion<>(
                    CheckInfo.log(
                            new CheckInfo.Criterion("wide-slot", "side-wall-share", "Share taken by the side walls",
                                    "1 − F ≤ 0.05", "laminar flow, any aspect"),
                            Kind.RATIO,
                            Side.AT_MOST,
                            PRACTICE),
                    c -> 1 - c.sideWallFactor(),
                    c -> WIDE,
                    c -> true),
            new Criterion<>(
                    CheckInfo.log(
                            new CheckInfo.Criterion("slow-taper", "slope", "Change of gap per length",
                                    "|b₂ − b₁|/L ≤ 0.1", "lubrication theory"),
                            Kind.RATIO,
                            Side.AT_MOST,
                            PRACTICE),
                    SlotCase::slope,
                    c -> SLOW,
                    c -> true),
            new Criterion<>(
                    CheckInfo.log(
                            new CheckInfo.Criterion("slow-taper", "inertia", "Inertia against friction in the taper",
                                    "(b u_m/ν) |b₂ − b₁|/L ≤ 1", "lubrication theory"),
                            Kind.RATIO,
                            Side.AT_MOST,
                            PRACTICE),
                    c -> c.reynolds() / 2 * c.slope(),
                    c -> 1,
                    c -> true));

    private SlotPanels() {}

    private static Check<SlotCase> transition(String author, String name, String formula, double limit, Source source) {
        return new Criterion<>(
                CheckInfo.log(
                        new CheckInfo.Criterion("transition", author, name, formula, "smooth slot between two walls"),
                        Kind.REYNOLDS_SLOT,
                        Side.AT_MOST,
                        source),
                SlotCase::reynolds,
                c -> limit,
                c -> true);
    }

    private static Check<SlotCase> entry(
            String author, String name, Source source, java.util.function.ToDoubleFunction<SlotCase> length) {
        return new Criterion<>(
                CheckInfo.log(
                        new CheckInfo.Criterion("entry", author, name, "L_e ≤ L", "laminar, flat inlet profile"),
                        Kind.LENGTH,
                        Side.AT_MOST,
                        source),
                length,
                SlotCase::length,
                c -> true);
    }
}
