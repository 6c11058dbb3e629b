package plusward.visit;

import jakarta.persistence.Embeddable;
import jakarta.persistence.Embedded;
import org.hibernate.annotations.EmbeddedColumnNaming;
import org.jspecify.annotations.Nullable;
import plusward.exam.PerEye;
import plusward.optics.Lens;

/** The columns of the lenses of both eyes. */
@Embeddable
record StoredEyes(
        @Embedded @EmbeddedColumnNaming("right_%s") @Nullable
        StoredLens right,

        @Embedded @EmbeddedColumnNaming("left_%s") @Nullable StoredLens left) {

    static StoredEyes of(PerEye<Lens> lenses) {
        return new StoredEyes(StoredLens.of(lenses.right()), StoredLens.of(lenses.left()));
    }

    static PerEye<Lens> lenses(@Nullable StoredEyes stored) {
        return stored == null
                ? PerEye.none()
                : new PerEye<>(StoredLens.lens(stored.right), StoredLens.lens(stored.left));
    }
}
