package plusward.visit;

import jakarta.persistence.Embeddable;
import org.jspecify.annotations.Nullable;
import plusward.exam.PerEye;
import plusward.optics.Millimetres;

/** The columns of one height over the lowest point of each lens. */
@Embeddable
record StoredHeights(@Nullable Double rightMm, @Nullable Double leftMm) {

    static StoredHeights of(PerEye<Millimetres> heights) {
        return new StoredHeights(StoredSegment.amount(heights.right()), StoredSegment.amount(heights.left()));
    }

    static PerEye<Millimetres> heights(@Nullable StoredHeights stored) {
        return stored == null
                ? PerEye.none()
                : new PerEye<>(StoredSegment.length(stored.rightMm), StoredSegment.length(stored.leftMm));
    }
}
