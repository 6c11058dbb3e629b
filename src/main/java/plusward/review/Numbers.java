package plusward.review;

import org.jspecify.annotations.Nullable;
import plusward.optics.Age;
import plusward.optics.Quantity;

/** Core quantities as plain numbers of the data format: three decimals, ages two. */
final class Numbers {

    private Numbers() {}

    static double plain(Quantity<?> quantity) {
        return Math.rint(quantity.amount() * 1000) / 1000 + 0.0;
    }

    static @Nullable Double orAbsent(@Nullable Quantity<?> quantity) {
        return quantity == null ? null : plain(quantity);
    }

    static double years(Age age) {
        return Math.rint(age.inYears() * 100) / 100 + 0.0;
    }
}
