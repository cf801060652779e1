package twofold.window.form;

import java.util.List;
import java.util.function.Function;
import java.util.function.Supplier;
import javafx.util.StringConverter;
import org.jspecify.annotations.Nullable;

/**
 * The items of a list in words.
 *
 * @param <T> the items, told apart by their words
 */
public final class InWords<T> extends StringConverter<T> {
    private final Supplier<List<T>> items;
    private final Function<T, String> words;

    /**
     * Makes it.
     *
     * @param items that are in the list now
     * @param words of an item
     */
    public InWords(Supplier<List<T>> items, Function<T, String> words) {
        this.items = items;
        this.words = words;
    }

    @Override
    public String toString(@Nullable T item) {
        return item == null ? "" : words.apply(item);
    }

    @Override
    public @Nullable T fromString(String text) {
        return items.get().stream()
                .filter(i -> words.apply(i).equals(text))
                .findFirst()
                .orElse(null);
    }
}
