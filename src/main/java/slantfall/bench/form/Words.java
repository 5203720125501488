package slantfall.bench.form;

import java.util.function.Function;
import javafx.util.StringConverter;

/** Items of a list shown by their words; nothing is ever read back from the words. */
final class Words {

    private Words() {}

    static <T> StringConverter<T> of(Function<T, String> words) {
        return new StringConverter<>() {
            @Override
            public String toString(T item) {
                return item == null ? "" : words.apply(item);
            }

            @Override
            public T fromString(String text) {
                throw new UnsupportedOperationException("the list is not editable");
            }
        };
    }
}
