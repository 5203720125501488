package slantfall.bench.plot;

import javafx.scene.layout.Region;
import slantfall.declare.Assessment;
import slantfall.quantity.UnitSystem;

/** Something drawn from an assessment. */
public interface Picture {

    /** The node that stands in the window. */
    Region node();

    /** Draws what an assessment says, within the frame that is being made. */
    void show(Assessment assessment, UnitSystem units);
}
