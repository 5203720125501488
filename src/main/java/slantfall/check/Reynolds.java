package slantfall.check;

import slantfall.quantity.Kind;

/** The Reynolds numbers in use for one film. */
final class Reynolds {

    private Reynolds() {}

    /** What a kind of Reynolds number is, in multiples of Γ/μ. */
    static double multiple(Kind kind) {
        if (kind == Kind.REYNOLDS_FILM) {
            return 1;
        }
        if (kind == Kind.REYNOLDS_FILM_4) {
            return 4;
        }
        if (kind == Kind.REYNOLDS_SURFACE) {
            return 1.5;
        }
        throw new IllegalArgumentException("kind " + kind + " is no Reynolds number of a film");
    }
}
