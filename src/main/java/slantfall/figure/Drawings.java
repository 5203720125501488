package slantfall.figure;

import java.util.Map;
import java.util.Optional;
import java.util.function.Function;

/** How each arrangement is drawn: one line each. An arrangement without a line gets a section that says so. */
final class Drawings {

    private static final Map<String, Function<Scene, Strip>> ALL = Map.of(
            "inclined-film", Drawings::film,
            "closed-slot", Drawings::slot);

    private Drawings() {}

    static Optional<Strip> strip(Scene scene) {
        return Optional.ofNullable(ALL.get(scene.assessment().setUp().arrangement())).map(f -> f.apply(scene));
    }

    private static Strip film(Scene scene) {
        double h = scene.assessment().value("thickness");
        double shear = scene.setting("interfacialShear");
        return new Strip(
                scene.setting("angle"),
                scene.setting("length"),
                h,
                h,
                new Strip.Upper(false, 0),
                new Strip.Stresses(scene.assessment().value("wallShear"), shear == 0 ? Double.NaN : shear),
                new Strip.Grips("thickness", "feed", "", "", false));
    }

    private static Strip slot(Scene scene) {
        return new Strip(
                scene.setting("angle"),
                scene.setting("length"),
                scene.setting("gap"),
                scene.setting("gapOutlet"),
                new Strip.Upper(true, scene.setting("wallSpeed")),
                new Strip.Stresses(scene.assessment().value("wallShearLower"), scene.assessment().value("wallShearUpper")),
                new Strip.Grips("gap", "", "gapOutlet", "wallSpeed", true));
    }
}
