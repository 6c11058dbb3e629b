package plusward.visit;

import jakarta.persistence.Embeddable;
import jakarta.persistence.Embedded;
import jakarta.persistence.EnumType;
import jakarta.persistence.Enumerated;
import org.hibernate.annotations.EmbeddedColumnNaming;
import org.jspecify.annotations.Nullable;
import plusward.exam.PerEye;
import plusward.exam.Segment;
import plusward.exam.SegmentHeights;
import plusward.exam.SegmentStyle;
import plusward.optics.Millimetres;

/** The columns of the segment's place and of the pupil it was judged against. */
@Embeddable
record StoredSegment(
        @Enumerated(EnumType.STRING) @Nullable SegmentStyle style,
        @Nullable Double rightMm,
        @Nullable Double leftMm,

        @Embedded @EmbeddedColumnNaming("height_%s") @Nullable
        StoredHeights line,

        @Embedded @EmbeddedColumnNaming("pupil_height_%s") @Nullable
        StoredHeights pupil,

        @Nullable Double pupilMm) {

    static StoredSegment of(Segment segment) {
        return new StoredSegment(
                segment.style(),
                amount(segment.offset().right()),
                amount(segment.offset().left()),
                StoredHeights.of(segment.heights().line()),
                StoredHeights.of(segment.heights().pupil()),
                amount(segment.pupil()));
    }

    static Segment segment(@Nullable StoredSegment stored) {
        return stored == null
                ? Segment.NONE
                : new Segment(
                        stored.style,
                        new PerEye<>(length(stored.rightMm), length(stored.leftMm)),
                        new SegmentHeights(StoredHeights.heights(stored.line), StoredHeights.heights(stored.pupil)),
                        length(stored.pupilMm));
    }

    static @Nullable Double amount(@Nullable Millimetres length) {
        return length == null ? null : length.amount();
    }

    static @Nullable Millimetres length(@Nullable Double amount) {
        return amount == null ? null : Millimetres.of(amount);
    }
}
