package plusward.visit;

import jakarta.persistence.Embeddable;
import jakarta.persistence.Embedded;
import java.util.EnumSet;
import java.util.Set;
import org.hibernate.annotations.EmbeddedColumnNaming;
import org.jspecify.annotations.Nullable;
import plusward.exam.Duction;
import plusward.exam.Ductions;

/** The columns of the ductions: for each eye and movement whether it is limited; all of them or none. */
@Embeddable
record StoredDuctions(
        @Embedded @EmbeddedColumnNaming("right_%s") StoredDuctions.Limited right,
        @Embedded @EmbeddedColumnNaming("left_%s") StoredDuctions.Limited left) {

    @Embeddable
    record Limited(boolean abduction, boolean adduction, boolean elevation, boolean depression) {

        private static Limited of(Set<Duction> limited) {
            return new Limited(
                    limited.contains(Duction.ABDUCTION),
                    limited.contains(Duction.ADDUCTION),
                    limited.contains(Duction.ELEVATION),
                    limited.contains(Duction.DEPRESSION));
        }

        private Set<Duction> ductions() {
            Set<Duction> limited = EnumSet.allOf(Duction.class);
            limited.removeIf(duction -> !has(duction));
            return limited;
        }

        private boolean has(Duction duction) {
            return switch (duction) {
                case ABDUCTION -> abduction;
                case ADDUCTION -> adduction;
                case ELEVATION -> elevation;
                case DEPRESSION -> depression;
            };
        }
    }

    static @Nullable StoredDuctions of(@Nullable Ductions ductions) {
        return ductions == null ? null : new StoredDuctions(Limited.of(ductions.right()), Limited.of(ductions.left()));
    }

    static @Nullable Ductions ductions(@Nullable StoredDuctions stored) {
        return stored == null ? null : new Ductions(stored.right.ductions(), stored.left.ductions());
    }
}
