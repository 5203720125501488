package slantfall.figure;

import java.util.LinkedHashMap;
import java.util.Map;
import slantfall.catalogue.Catalogue;
import slantfall.declare.Assessment;
import slantfall.declare.LiquidBase;
import slantfall.declare.SetUp;
import slantfall.declare.Value;

/** Set-ups of a measured liquid, the ordinary and the extreme, by name. Invented. */
final class Cases {

    private Cases() {}

    static SetUp film() {
        return liquid(SetUp.blank("inclined-film", LiquidBase.measured()), 0.01)
                .with("feed", Value.of(0.3))
                .with("angle", Value.of(Math.toRadians(50)));
    }

    static SetUp slot() {
        return liquid(SetUp.blank("closed-slot", LiquidBase.measured()), 0.5);
    }

    private static SetUp liquid(SetUp setUp, double viscosity) {
        return setUp.with("liquid.density", Value.of(1100))
                .with("liquid.viscosity", Value.of(viscosity))
                .with("liquid.surfaceTension", Value.of(0.05));
    }

    static SetUp with(SetUp setUp, Object... pairs) {
        SetUp changed = setUp;
        for (int i = 0; i < pairs.length; i += 2) {
            changed = changed.with((String) pairs[i], Value.of(((Number) pairs[i + 1]).doubleValue()));
        }
        return changed;
    }

    static Assessment assess(SetUp setUp) {
        return Catalogue.named(setUp.arrangement()).assess(setUp);
    }

    static Map<String, SetUp> all() {
        Map<String, SetUp> all = new LinkedHashMap<>();
        all.put("film", film());
        all.put("film, nothing known of the liquid", SetUp.blank("inclined-film", LiquidBase.measured()));
        all.put("film, level", with(film(), "angle", 0));
        all.put("film, level with gas drag", with(film(), "angle", 0, "interfacialShear", 2));
        all.put("film, nearly level", with(film(), "angle", 0.001));
        all.put("film, upright", with(film(), "angle", Math.PI / 2));
        all.put("film, no feed", with(film(), "feed", 0));
        all.put("film, thick", with(film(), "feed", 50, "length", 0.05, "liquid.viscosity", 50));
        all.put("film, gas drags downhill", with(film(), "interfacialShear", 20));
        all.put("film, gas drags the surface uphill", with(film(), "interfacialShear", -8));
        all.put("film, hardly any", with(film(), "feed", 1e-9, "length", 20));
        all.put("film, turbulent", with(film(), "feed", 5, "liquid.viscosity", 0.001));
        all.put("slot", with(slot(), "pressureDrop", 20000));
        all.put("slot, nothing known of the liquid", SetUp.blank("closed-slot", LiquidBase.measured()));
        all.put("slot, down", with(slot(), "angle", Math.PI / 2, "pressureDrop", 1000));
        all.put("slot, up", with(slot(), "angle", -Math.PI / 2, "pressureDrop", 60000));
        all.put("slot, level and still", with(slot(), "angle", 0));
        all.put("slot, backwards", with(slot(), "pressureDrop", -60000));
        all.put("slot, moving wall", with(slot(), "wallSpeed", 0.5));
        all.put("slot, wall against gravity", with(slot(), "wallSpeed", -0.02));
        all.put("slot, wall fast", with(slot(), "wallSpeed", 1000));
        all.put("slot, reversal", with(slot(), "wallSpeed", 0.1, "pressureDrop", -9000, "gapOutlet", 0.0007));
        all.put("slot, narrow and long", with(slot(), "gap", 5e-5, "length", 20, "pressureDrop", 1e5));
        all.put("slot, wide open and short", with(slot(), "gap", 0.1, "length", 0.005));
        all.put("slot, taper", with(slot(), "gap", 0.002, "gapOutlet", 0.0005, "pressureDrop", 50000));
        all.put("slot, taper that opens", with(slot(), "gap", 5e-5, "gapOutlet", 0.1, "pressureDrop", 50000));
        all.put("slot, huge pressure", with(slot(), "pressureDrop", 1e9));
        return all;
    }
}
