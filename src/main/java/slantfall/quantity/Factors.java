package slantfall.quantity;

/** The numbers that unit factors are built from, each exact by definition unless said. */
final class Factors {

    /** International foot, 1959 [m]. */
    static final double FOOT = 0.3048;
    /** Inch [m]. */
    static final double INCH = 0.0254;
    /** Thousandth of an inch [m]. */
    static final double MIL = 2.54e-5;
    /** Avoirdupois pound [kg]. */
    static final double POUND = 0.45359237;
    /** Standard gravity, CGPM 1901 [m/s2]. */
    static final double GRAVITY = 9.80665;
    /** Pound-force [N]. */
    static final double POUND_FORCE = POUND * GRAVITY;
    /** US liquid gallon, 231 cubic inches [m3]. */
    static final double GALLON = 3.785411784e-3;
    /** Imperial gallon [m3]. */
    static final double IMPERIAL_GALLON = 4.54609e-3;
    /** International Table British thermal unit [J]. */
    static final double BTU = 1055.05585262;
    /** International Table calorie [J]. */
    static final double CALORIE = 4.1868;
    /** Fahrenheit degree as a difference [K]. */
    static final double FAHRENHEIT = 5.0 / 9;
    /** Minute [s]. */
    static final double MINUTE = 60;
    /** Hour [s]. */
    static final double HOUR = 3600;
    /** Day [s]. */
    static final double DAY = 86400;
    /** Standard atmosphere [Pa]. */
    static final double ATMOSPHERE = 101325;
    /** Conventional mercury, 13 595.1 kg/m3 under standard gravity: one metre of it [Pa]. */
    static final double METRE_OF_MERCURY = 13595.1 * GRAVITY;
    /** Conventional water, 1000 kg/m3 under standard gravity: one metre of it [Pa]. */
    static final double METRE_OF_WATER = 1000 * GRAVITY;
    /** Density of water near 4 °C, measured, Tanaka 2001 [kg/m3]. */
    static final double WATER_4C = 999.97495;
    /** Density of water at 60 °F, rounded from the tables of the trade [kg/m3]. */
    static final double WATER_60F = 999.016;

    private Factors() {
    }
}
