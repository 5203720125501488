package slantfall.declare;

/**
 * One physical layout that liquid flows in. Everything above is generic over this face: adding an arrangement is one
 * class and one line in the catalogue.
 */
public interface Arrangement {

    /** Stable key, as in files. */
    String key();

    /** What can be set, read and checked under this structure. */
    Declaration declare(Structure structure);

    /** A new evaluator, for one thread. */
    Evaluator evaluator(Structure structure);

    /** Everything computed for a set-up; its readings and margins come from the evaluator. */
    Assessment assess(SetUp setUp);
}
