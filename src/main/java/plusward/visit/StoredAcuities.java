package plusward.visit;

import jakarta.persistence.Embeddable;
import jakarta.persistence.Embedded;
import org.hibernate.annotations.EmbeddedColumnNaming;
import org.jspecify.annotations.Nullable;
import plusward.exam.Acuities;
import plusward.exam.PerEye;

/** The columns of the acuities of each eye and of both together. */
@Embeddable
record StoredAcuities(
        @Embedded @EmbeddedColumnNaming("right_%s") @Nullable
        StoredAcuity right,

        @Embedded @EmbeddedColumnNaming("left_%s") @Nullable StoredAcuity left,
        @Embedded @EmbeddedColumnNaming("both_%s") @Nullable StoredAcuity both) {

    static StoredAcuities of(Acuities acuities) {
        return new StoredAcuities(
                StoredAcuity.of(acuities.each().right()),
                StoredAcuity.of(acuities.each().left()),
                StoredAcuity.of(acuities.both()));
    }

    static Acuities acuities(@Nullable StoredAcuities stored) {
        return stored == null
                ? Acuities.NONE
                : new Acuities(
                        new PerEye<>(StoredAcuity.acuity(stored.right), StoredAcuity.acuity(stored.left)),
                        StoredAcuity.acuity(stored.both));
    }
}
