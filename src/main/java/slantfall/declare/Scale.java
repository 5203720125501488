package slantfall.declare;

/** How a quantity is spread over a slider and how distances on it are measured. */
public enum Scale {
    /** Distances are differences, scaled by the full usual range. */
    LINEAR,
    /** Distances are natural logarithms of ratios. */
    LOG
}
