package slantfall.bench.model;

import java.util.Optional;
import slantfall.quantity.Kind;
import slantfall.quantity.Unit;

/** The unit in which a number was typed, as far as the text ends in the symbol of one. */
final class TypedUnit {

    private TypedUnit() {}

    static Optional<Unit> of(String typed, Kind kind) {
        String text = typed.strip();
        return kind.units().stream()
                .filter(u -> !u.symbol().equals("1"))
                .filter(u -> text.endsWith(" " + u.symbol()) || text.endsWith(" " + u.label()))
                .findFirst();
    }
}
