package slantfall.quantity;

import java.util.Objects;
import slantfall.source.Source;

/**
 * What a unit rests on.
 *
 * @param source where its factor comes from
 * @param need what a conversion needs besides the number
 * @param note the word that keeps it apart from its namesakes, such as "US gallon"; empty where there are none
 */
public record Basis(Source source, Need need, String note) {

    public Basis {
        Objects.requireNonNull(source, "source");
        Objects.requireNonNull(need, "need");
        Objects.requireNonNull(note, "note");
    }
}
