package plusward.visit;

import jakarta.persistence.Embeddable;
import jakarta.persistence.Embedded;
import java.time.LocalDate;
import org.hibernate.annotations.EmbeddedColumnNaming;
import org.jspecify.annotations.Nullable;
import plusward.exam.Glasses;
import plusward.exam.HoursPerDay;

/** The columns of the glasses worn: as ordered, since when, and for how long each day. */
@Embeddable
record StoredGlasses(
        @Embedded @EmbeddedColumnNaming("worn_%s") @Nullable StoredLensPair asOrdered,
        @Nullable LocalDate wornSince,
        @Nullable Double wearHours) {

    static StoredGlasses of(Glasses glasses) {
        HoursPerDay wear = glasses.wear();
        return new StoredGlasses(
                StoredLensPair.of(glasses.asOrdered()), glasses.since(), wear == null ? null : wear.amount());
    }

    static Glasses glasses(@Nullable StoredGlasses stored) {
        return stored == null
                ? Glasses.NONE
                : new Glasses(
                        StoredLensPair.pair(stored.asOrdered),
                        stored.wornSince,
                        stored.wearHours == null ? null : HoursPerDay.of(stored.wearHours));
    }
}
