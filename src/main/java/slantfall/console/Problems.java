package slantfall.console;

import java.io.IOException;
import java.io.UncheckedIOException;
import slantfall.quantity.QuantityProblem;
import slantfall.store.StoreProblem;

/** Which exceptions say that the input is wrong. */
final class Problems {

    private Problems() {}

    static boolean isInput(Throwable e) {
        return e instanceof StoreProblem
                || e instanceof QuantityProblem
                || e instanceof IllegalArgumentException
                || e instanceof IOException
                || e instanceof UncheckedIOException;
    }
}
