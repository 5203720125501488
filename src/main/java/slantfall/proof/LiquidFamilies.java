package slantfall.proof;

import java.util.List;
import slantfall.liquid.Correlations;
import slantfall.liquid.HandbookWater;
import slantfall.liquid.If97Region1;
import slantfall.liquid.MaoDuan;
import slantfall.liquid.WaterViscosity2008;

/** Section 10: the correlations of the liquids, the very ones that presets name. */
final class LiquidFamilies {

    /** The water formulas hold at this pressure alone [Pa]. */
    private static final double PRESSURE = 1e5;

    static final List<Family> ALL = List.of(
            Family.list("10.SR6-08", "density, viscosity, conductivity, heat capacity of water", LiquidFamilies::water),
            Family.one("10.SR6.mu", "viscosity of water", in -> pure("iapws-sr6-08-viscosity", in)),
            Family.one("10.R12-08", "viscosity of water at a given density",
                    in -> WaterViscosity2008.at(in.temperature(), in.positive("rho"))),
            Family.list("10.VFT.water", "viscosity of water by a handbook fit",
                    in -> java.util.Arrays.stream(in.list("T")).map(HandbookWater::viscosity).toArray()),
            Family.list("10.IF97.R1", "specific volume of water under pressure", in -> new double[] {
                If97Region1.specificVolume(300, 3e6), If97Region1.specificVolume(300, 80e6),
                If97Region1.specificVolume(500, 3e6)
            }),
            Family.list("10.NaCl.MaoDuan", "viscosity of sodium chloride brine", LiquidFamilies::maoDuan),
            Family.one("10.R1-76", "surface tension of water", in -> pure("iapws-r1-76-surface-tension", in)),
            Family.one("10.gly.SO", "viscosity of glycerol and water", in -> mixed("cheng-2008-viscosity", in)),
            Family.list("10.gly.Cheng", "viscosity and density of glycerol and water", in -> new double[] {
                mixed("cheng-2008-viscosity", in), mixed("volk-kaehler-2018-density", in)
            }),
            Family.one("10.NaCl.Laliberte", "viscosity of sodium chloride brine",
                    in -> mixed("laliberte-2009-sodium-chloride-viscosity", in)),
            Family.one("10.NaCl.LalRho", "density of sodium chloride brine",
                    in -> mixed("laliberte-2009-sodium-chloride-density", in)),
            Family.one("10.suc.MG", "viscosity of sucrose syrup", in -> Correlations.named("genotelle-1978-viscosity")
                    .at(in.temperature(), share("Bx", in.number("Bx") / 100))),
            Family.one("10.suc.BJ40", "viscosity of sucrose syrup", in -> mixed("genotelle-1978-viscosity", in)),
            Family.one("10.suc.BJ60", "viscosity of sucrose syrup", in -> mixed("genotelle-1978-viscosity", in)));

    private LiquidFamilies() {}

    private static double[] water(Inputs in) {
        if (in.positive("p") != PRESSURE) {
            throw new IllegalArgumentException("input p is " + in.number("p") + "; the formulas hold at 100000 Pa alone");
        }
        return new double[] {
            pure("iapws-sr6-08-density", in), pure("iapws-sr6-08-viscosity", in),
            pure("iapws-sr6-08-conductivity", in), pure("iapws-sr6-08-heat-capacity", in)
        };
    }

    private static double[] maoDuan(Inputs in) {
        double relative = MaoDuan.relative(in.temperature(), in.positive("molality"));
        return new double[] {relative, relative * pure("iapws-sr6-08-viscosity", in)};
    }

    private static double pure(String key, Inputs in) {
        return Correlations.named(key).at(in.temperature(), 0);
    }

    private static double mixed(String key, Inputs in) {
        return Correlations.named(key).at(in.temperature(), share("w", in.number("w")));
    }

    private static double share(String name, double w) {
        if (!(w >= 0 && w <= 1)) {
            throw new IllegalArgumentException("input " + name + " is a mass fraction of " + w + "; it lies between 0 and 1");
        }
        return w;
    }
}
