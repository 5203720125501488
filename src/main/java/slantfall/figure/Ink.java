package slantfall.figure;

/** What a stroke means. Colours belong to the palette; meaning never rests on colour alone. */
public enum Ink {
    PAPER,
    TEXT,
    FAINT,
    AXIS,
    GRID,
    WALL,
    MOVING_WALL,
    LIQUID,
    LIQUID_EDGE,
    VELOCITY,
    STRESS,
    RATE,
    PRESSURE,
    REVERSED,
    GRAVITY,
    HANDLE,
    CURSOR,
    CLEAR,
    NEAR,
    CROSSED,
    UNKNOWN
}
