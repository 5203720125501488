package slantfall.quantity;

import slantfall.source.Mark;
import slantfall.source.Source;

/** The sources that unit factors rest on. */
final class Sources {

    static final Source SI = Source.of("si-brochure-9",
            "BIPM, The International System of Units (SI Brochure), 9th edition, 2019", Mark.FROM_MEMORY);
    /** Base factors read in a transcription of the table; compounds are products of them. */
    static final Source NIST = new Source("nist-sp-811",
            "Thompson and Taylor, Guide for the Use of the SI, NIST Special Publication 811, 2008", "appendix B.9",
            Mark.SECOND_HAND);
    /** Density of water at its greatest, near 4 °C: a5 of the equation. */
    static final Source WATER_4C = new Source("tanaka-2001",
            "Tanaka et al. 2001, Metrologia 38, 301-309", "a5 of table 1", Mark.SECOND_HAND);
    static final Source BAUME = Source.of("nbs-baume",
            "US National Bureau of Standards scale for liquids heavier than water, 145/(145 - °Bé), 60/60 °F",
            Mark.FROM_MEMORY);
    static final Source BRIX = Source.of("brix", "°Bx: mass per cent of sucrose, by the meaning of the scale",
            Mark.COMMON_PRACTICE);
    static final Source DEFINITION = Source.of("definition", "by the meaning of the words", Mark.COMMON_PRACTICE);
    static final Source BWG = new Source("holtzapffel-bwg",
            "Holtzapffel, Mechanical Manipulation: measured Birmingham wire gauge",
            "as quoted in Notes on Building Construction, part 3", Mark.SECOND_HAND);

    private Sources() {
    }
}
