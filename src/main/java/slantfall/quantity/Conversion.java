package slantfall.quantity;

import java.util.List;

/**
 * A way into a kind from another one, by what the surroundings tell.
 *
 * @param from the kind whose units are accepted
 * @param need what it takes
 * @param factor constant factor between the SI units once the need is met
 */
record Conversion(Kind from, Need need, double factor) {

    private static Conversion by(Kind from, Need need) {
        return new Conversion(from, need, 1);
    }

    /** The ways into a kind. */
    static List<Conversion> into(Kind kind) {
        return switch (kind) {
            case MASS_FLOW_PER_WIDTH -> List.of(by(Kind.VOLUME_FLOW_PER_WIDTH, Need.DENSITY),
                    by(Kind.MASS_FLOW, Need.PER_WIDTH), by(Kind.VOLUME_FLOW, Need.DENSITY_PER_WIDTH));
            case VOLUME_FLOW_PER_WIDTH -> List.of(by(Kind.MASS_FLOW_PER_WIDTH, Need.PER_DENSITY),
                    by(Kind.VOLUME_FLOW, Need.PER_WIDTH), by(Kind.MASS_FLOW, Need.PER_DENSITY_PER_WIDTH));
            case MASS_FLOW -> List.of(by(Kind.VOLUME_FLOW, Need.DENSITY), by(Kind.MASS_FLOW_PER_WIDTH, Need.WIDTH),
                    by(Kind.VOLUME_FLOW_PER_WIDTH, Need.DENSITY_WIDTH));
            case VOLUME_FLOW -> List.of(by(Kind.MASS_FLOW, Need.PER_DENSITY),
                    by(Kind.VOLUME_FLOW_PER_WIDTH, Need.WIDTH),
                    by(Kind.MASS_FLOW_PER_WIDTH, Need.PER_DENSITY_WIDTH));
            case VISCOSITY -> List.of(by(Kind.KINEMATIC_VISCOSITY, Need.DENSITY));
            case KINEMATIC_VISCOSITY -> List.of(by(Kind.VISCOSITY, Need.PER_DENSITY));
            case PRESSURE_DIFFERENCE -> List.of(new Conversion(Kind.HEAD, Need.DENSITY, Factors.GRAVITY));
            case HEAD -> List.of(new Conversion(Kind.PRESSURE_DIFFERENCE, Need.PER_DENSITY, 1 / Factors.GRAVITY));
            case COATING_MASS -> List.of(by(Kind.LENGTH, Need.DENSITY));
            case MASS -> List.of(by(Kind.VOLUME, Need.DENSITY));
            case VOLUME -> List.of(by(Kind.MASS, Need.PER_DENSITY));
            default -> List.of();
        };
    }
}
