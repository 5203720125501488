package slantfall.quantity;

import java.util.List;
import java.util.Locale;

/** A kind of quantity. Kinds of the same dimension that people confuse are kept apart. */
public enum Kind {
    /** Inclination, from the horizontal. */
    ANGLE("angle from the horizontal", BasicUnits.angle()),
    /** Contact angle, measured through the liquid. */
    CONTACT_ANGLE("contact angle", BasicUnits.contactAngle()),
    LENGTH("length", BasicUnits.length()),
    AREA("area", BasicUnits.area()),
    VOLUME("volume", BasicUnits.volume()),
    MASS("mass", BasicUnits.mass()),
    TIME("time", BasicUnits.time()),
    FREQUENCY("frequency", BasicUnits.frequency()),
    VELOCITY("velocity", BasicUnits.velocity()),
    ACCELERATION("acceleration", BasicUnits.acceleration()),
    /** Spatial growth rate of a wave; positive grows. */
    GROWTH_RATE("growth rate along the flow", BasicUnits.growthRate()),
    MASS_FLOW("mass flow in total", FlowUnits.mass()),
    VOLUME_FLOW("volume flow in total", FlowUnits.volume()),
    MASS_FLOW_PER_WIDTH("mass flow per width", FlowUnits.massPerWidth()),
    VOLUME_FLOW_PER_WIDTH("volume flow per width", FlowUnits.volumePerWidth()),
    PRESSURE_DIFFERENCE("pressure difference", MechanicalUnits.pressureDifference()),
    PRESSURE_ABSOLUTE("absolute pressure", MechanicalUnits.pressureAbsolute()),
    /** Pressure or body force over length. */
    PRESSURE_GRADIENT("pressure gradient", MechanicalUnits.pressureGradient()),
    /** Length of a column of the product itself. */
    HEAD("head of product", MechanicalUnits.head()),
    STRESS("stress", MechanicalUnits.stress()),
    SHEAR_RATE("shear rate", BasicUnits.shearRate()),
    VISCOSITY("dynamic viscosity", MechanicalUnits.viscosity()),
    KINEMATIC_VISCOSITY("kinematic viscosity", MechanicalUnits.kinematicViscosity()),
    /** Consistency of a power law or Herschel-Bulkley liquid; n is the liquid's own index. */
    CONSISTENCY("consistency", MechanicalUnits.consistency()),
    DENSITY("density", MechanicalUnits.density()),
    SURFACE_TENSION("surface tension", MechanicalUnits.surfaceTension()),
    TEMPERATURE("temperature", BasicUnits.temperature()),
    TEMPERATURE_DIFFERENCE("temperature difference", BasicUnits.temperatureDifference()),
    /** A share of a whole: strength by mass, solids, wetted fraction. */
    FRACTION("fraction", BasicUnits.fraction()),
    RATIO("ratio", BasicUnits.ratio()),
    COUNT("count", BasicUnits.number()),
    REYNOLDS_FILM("Reynolds number Γ/μ", BasicUnits.number()),
    REYNOLDS_FILM_4("Reynolds number 4Γ/μ", BasicUnits.number()),
    REYNOLDS_SURFACE("Reynolds number u_s h/ν (surface speed and thickness)", BasicUnits.number()),
    REYNOLDS_SLOT("Reynolds number 2b u/ν (hydraulic diameter D_h = 2b)", BasicUnits.number()),
    KAPITZA("Kapitza number", BasicUnits.number()),
    CONDUCTIVITY("thermal conductivity", ThermalUnits.conductivity()),
    HEAT_CAPACITY("heat capacity", ThermalUnits.heatCapacity()),
    LATENT_HEAT("latent heat", ThermalUnits.latentHeat()),
    HEAT_FLUX("heat flux", ThermalUnits.heatFlux()),
    HEAT_TRANSFER_COEFFICIENT("heat transfer coefficient", ThermalUnits.heatTransferCoefficient()),
    POWER("power", ThermalUnits.power()),
    /** Mass of coating over an area, wet unless the setting says otherwise. */
    COATING_MASS("coating mass per area", FlowUnits.coatingMass());

    private final String words;
    private final List<Unit> units;

    Kind(String words, List<Unit> units) {
        this.words = words;
        this.units = List.copyOf(units);
    }

    /** The stable word for files and programs. */
    public String key() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** The name for people; a Reynolds number names its definition. */
    public String words() {
        return words;
    }

    /** The coherent SI unit. */
    public Unit si() {
        return units.get(0);
    }

    /** The units of this kind, the coherent SI unit first, then the likeliest. */
    public List<Unit> units() {
        return units;
    }

    /** The unit with a symbol, or an {@link IllegalArgumentException} that names kind and symbol. */
    public Unit unit(String symbol) {
        return units.stream().filter(u -> u.symbol().equals(symbol)).findFirst()
                .orElseThrow(() -> new IllegalArgumentException("no unit " + symbol + " of kind " + key()));
    }

    /** Whether the quantity is a bare number. */
    public boolean dimensionless() {
        return si().symbol().equals("1");
    }

    /** Whether the quantity counts whole things. */
    public boolean count() {
        return this == COUNT;
    }
}
