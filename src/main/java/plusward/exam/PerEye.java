package plusward.exam;

import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;

/**
 * One thing measured in each eye; either may be missing.
 *
 * @param <T> what was measured
 * @param right of the right eye; absent when not measured
 * @param left of the left eye; absent when not measured
 */
public record PerEye<T>(@Nullable T right, @Nullable T left) {

    /** Neither eye was measured. */
    public static <T> PerEye<T> none() {
        return new PerEye<>(null, null);
    }

    /** The same in both eyes. */
    public static <T> PerEye<T> both(T value) {
        return new PerEye<>(value, value);
    }

    /** What was measured in this eye; absent when it was not. */
    public @Nullable T of(Eye eye) {
        return eye == Eye.RIGHT ? right : left;
    }

    /** True when neither eye was measured. */
    public boolean isEmpty() {
        return right == null && left == null;
    }

    /** True when both eyes were measured. */
    public boolean isComplete() {
        return right != null && left != null;
    }

    /** The eyes that were measured, right first. */
    public Stream<T> measured() {
        return Stream.of(Optional.<T>ofNullable(right), Optional.<T>ofNullable(left))
                .flatMap(Optional::stream);
    }

    /** The same for each measured eye; a missing eye, or one for which the function gives null, stays missing. */
    public <R> PerEye<R> map(Function<T, @Nullable R> function) {
        return new PerEye<>(right == null ? null : function.apply(right), left == null ? null : function.apply(left));
    }

    /** As the mirror shows it: right and left change places. */
    public PerEye<T> swapped() {
        return new PerEye<>(left, right);
    }
}
