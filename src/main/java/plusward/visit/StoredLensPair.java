package plusward.visit;

import jakarta.persistence.Column;
import jakarta.persistence.Embeddable;
import jakarta.persistence.Embedded;
import org.hibernate.annotations.EmbeddedColumnNaming;
import org.jspecify.annotations.Nullable;
import plusward.exam.LensPair;
import plusward.exam.PerEye;
import plusward.optics.Dioptres;

/** The columns of a pair of lenses with their add. */
@Embeddable
record StoredLensPair(
        @Embedded @EmbeddedColumnNaming("right_%s") @Nullable
        StoredLens right,

        @Embedded @EmbeddedColumnNaming("left_%s") @Nullable StoredLens left,
        @Column(name = "add_d") @Nullable Double add) {

    static StoredLensPair of(LensPair pair) {
        Dioptres add = pair.add();
        return new StoredLensPair(
                StoredLens.of(pair.lenses().right()),
                StoredLens.of(pair.lenses().left()),
                add == null ? null : add.amount());
    }

    static LensPair pair(@Nullable StoredLensPair stored) {
        return stored == null
                ? LensPair.NONE
                : new LensPair(
                        new PerEye<>(StoredLens.lens(stored.right), StoredLens.lens(stored.left)),
                        stored.add == null ? null : Dioptres.of(stored.add));
    }
}
