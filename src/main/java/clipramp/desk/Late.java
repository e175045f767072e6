package clipramp.desk;

import java.util.Objects;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;

/**
 * Something that is made when it is first needed, on the window's thread, so that the first window need not wait for it.
 *
 * @param <T> what it is
 */
final class Late<T> {
    private final Supplier<T> making;
    private @Nullable T made;

    Late(Supplier<T> making) {
        this.making = making;
    }

    T get() {
        if (made == null) {
            made = making.get();
        }
        return Objects.requireNonNull(made);
    }

    boolean isMade() {
        return made != null;
    }
}
