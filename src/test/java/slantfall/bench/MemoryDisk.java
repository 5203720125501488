package slantfall.bench;

import java.nio.file.Path;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import slantfall.bench.shell.FileDesk;
import slantfall.declare.LiquidBase;
import slantfall.declare.Requirement;
import slantfall.declare.SetUp;
import slantfall.declare.Value;
import slantfall.liquid.Correlations;
import slantfall.liquid.Preset;
import slantfall.liquid.Property;
import slantfall.liquid.Provision;
import slantfall.liquid.Range;
import slantfall.store.FileStamp;
import slantfall.store.Preferences;

/** Files in memory, with the faults a test wants. */
public final class MemoryDisk implements FileDesk {

    public final Map<Path, SetUp> files = new LinkedHashMap<>();
    public Preferences preferences = Preferences.initial();
    public Preferences written;
    public Found kept;
    public RuntimeException fault;
    public boolean changedOutside;

    @Override
    public Opened read(Path file) {
        fail();
        SetUp setUp = files.get(file);
        if (setUp == null) {
            throw new IllegalStateException(file + ": no such file; choose another.");
        }
        return new Opened(setUp, null, List.of());
    }

    @Override
    public FileStamp write(SetUp setUp, Path file) {
        fail();
        files.put(file, setUp);
        changedOutside = false;
        return null;
    }

    private void fail() {
        if (fault != null) {
            throw fault;
        }
    }

    @Override
    public boolean changed(Path file, FileStamp stamp) {
        return changedOutside;
    }

    @Override
    public List<String> examples() {
        return List.of("film", "slot");
    }

    @Override
    public Opened example(String name) {
        return new Opened(name.equals("film") ? film() : slot(), null, List.of());
    }

    /** Water running down a plate, with one requirement. */
    public static SetUp film() {
        return SetUp.blank("inclined-film", LiquidBase.of(water()))
                .with("angle", Value.typed(Math.toRadians(60), "60 deg"))
                .with("feed", Value.typed(0.1, "0.1 kg/(m s)"))
                .withRequirements(List.of(
                        new Requirement("thickness", Double.NaN, 1e-3, 0, "spray", "", "1 mm")))
                .titled("Rinse wall");
    }

    /** Glycerol in a narrowing slot. */
    public static SetUp slot() {
        return SetUp.blank("closed-slot", LiquidBase.of(glycerol()))
                .with("gap", Value.typed(0.002, "2 mm"))
                .with("gapOutlet", Value.typed(0.001, "1 mm"))
                .with("pressureDrop", Value.typed(2e4, "20 kPa"))
                .with("liquid.strength", Value.typed(0.8, "80 %"))
                .titled("Feed slot");
    }

    @Override
    public List<Preset> presets() {
        return List.of(water(), glycerol());
    }

    /** Water by its correlations. */
    public static Preset water() {
        Map<Property, Provision> by = new EnumMap<>(Property.class);
        by.put(Property.DENSITY, law("iapws-sr6-08-density"));
        by.put(Property.VISCOSITY, law("iapws-sr6-08-viscosity"));
        by.put(Property.SURFACE_TENSION, law("iapws-r1-76-surface-tension"));
        by.put(Property.CONDUCTIVITY, law("iapws-sr6-08-conductivity"));
        by.put(Property.HEAT_CAPACITY, law("iapws-sr6-08-heat-capacity"));
        by.put(Property.VAPOUR_PRESSURE, law("iapws-sr1-86-vapour-pressure"));
        return new Preset("water", "Water", "", by, Range.celsius(0, 100), Range.ANY,
                new Preset.Words(List.of(), "Pure water."));
    }

    /** Glycerol in water by its correlations. */
    public static Preset glycerol() {
        Map<Property, Provision> by = new EnumMap<>(Property.class);
        by.put(Property.DENSITY, law("volk-kaehler-2018-density"));
        by.put(Property.VISCOSITY, law("cheng-2008-viscosity"));
        return new Preset("glycerol-water", "Glycerol in water", "glycerol", by, Range.celsius(0, 100),
                new Range(0, 1), new Preset.Words(List.of("Spilt glycerol is slippery."), "Mass fraction of glycerol."));
    }

    private static Provision law(String key) {
        return new Provision.Correlated(Correlations.named(key));
    }

    @Override
    public void keep(SetUp setUp, Path file) {
        kept = new Found(setUp, file);
    }

    @Override
    public void forget() {
        kept = null;
    }

    @Override
    public Optional<Found> found() {
        return Optional.ofNullable(kept);
    }

    @Override
    public Preferences preferences() {
        return preferences;
    }

    @Override
    public void prefer(Preferences wanted) {
        preferences = wanted;
    }

    @Override
    public void writePreferences() {
        written = preferences;
    }

    @Override
    public List<String> reports() {
        return List.of();
    }
}
