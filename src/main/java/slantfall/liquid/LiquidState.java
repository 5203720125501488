package slantfall.liquid;

/** The properties of a liquid at one state [SI], NaN where unknown. Filled in place, so that nothing is allocated. */
public final class LiquidState {

    /** Temperature [K], NaN if no property depends on it. */
    public double temperature = Double.NaN;

    /** Mass fraction of the solute, NaN if there is none. */
    public double strength = Double.NaN;

    /** [kg/m³]. */
    public double density = Double.NaN;

    /** Dynamic viscosity [Pa s]. */
    public double viscosity = Double.NaN;

    /** [N/m]. */
    public double surfaceTension = Double.NaN;

    /** Through the liquid [rad]. */
    public double contactAngle = Double.NaN;

    /** [W/(m K)]. */
    public double conductivity = Double.NaN;

    /** At constant pressure [J/(kg K)]. */
    public double heatCapacity = Double.NaN;

    /** Absolute [Pa]. */
    public double vapourPressure = Double.NaN;

    /** The value of a property [SI]. */
    public double get(Property property) {
        switch (property) {
            case DENSITY:
                return density;
            case VISCOSITY:
                return viscosity;
            case SURFACE_TENSION:
                return surfaceTension;
            case CONTACT_ANGLE:
                return contactAngle;
            case CONDUCTIVITY:
                return conductivity;
            case HEAT_CAPACITY:
                return heatCapacity;
            default:
                return vapourPressure;
        }
    }

    /** Sets the value of a property [SI]. */
    void set(Property property, double value) {
        switch (property) {
            case DENSITY:
                density = value;
                break;
            case VISCOSITY:
                viscosity = value;
                break;
            case SURFACE_TENSION:
                surfaceTension = value;
                break;
            case CONTACT_ANGLE:
                contactAngle = value;
                break;
            case CONDUCTIVITY:
                conductivity = value;
                break;
            case HEAT_CAPACITY:
                heatCapacity = value;
                break;
            default:
                vapourPressure = value;
                break;
        }
    }
}
