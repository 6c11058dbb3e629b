package plusward.visit;

import jakarta.persistence.Column;
import jakarta.persistence.Embeddable;
import org.jspecify.annotations.Nullable;
import plusward.optics.Lens;

/** The columns of a lens, in the cylinder form in which it was typed. */
@Embeddable
record StoredLens(
        @Column(name = "sphere_d") double sphere,
        @Column(name = "cylinder_d") double cylinder,
        int axisDeg) {

    static @Nullable StoredLens of(@Nullable Lens lens) {
        return lens == null
                ? null
                : new StoredLens(
                        lens.sphere().amount(),
                        lens.cylinder().amount(),
                        lens.axis().inDegrees());
    }

    static @Nullable Lens lens(@Nullable StoredLens stored) {
        return stored == null ? null : Lens.of(stored.sphere, stored.cylinder, stored.axisDeg);
    }
}
