package plusward.visit;

import jakarta.persistence.Embeddable;
import jakarta.persistence.Embedded;
import jakarta.persistence.EnumType;
import jakarta.persistence.Enumerated;
import org.hibernate.annotations.EmbeddedColumnNaming;
import org.jspecify.annotations.Nullable;
import plusward.exam.Cycloplegic;
import plusward.exam.CycloplegicAgent;

/** The columns of a refraction under cycloplegia and of how it was brought about. */
@Embeddable
record StoredCycloplegic(
        @Embedded @EmbeddedColumnNaming("%s") @Nullable StoredEyes refraction,
        @Enumerated(EnumType.STRING) @Nullable CycloplegicAgent agent,
        @Nullable Integer drops,
        @Nullable Integer minutes) {

    static StoredCycloplegic of(Cycloplegic cycloplegic) {
        return new StoredCycloplegic(
                StoredEyes.of(cycloplegic.refraction()),
                cycloplegic.agent(),
                cycloplegic.drops(),
                cycloplegic.minutes());
    }

    static Cycloplegic cycloplegic(@Nullable StoredCycloplegic stored) {
        return stored == null
                ? Cycloplegic.NONE
                : new Cycloplegic(StoredEyes.lenses(stored.refraction), stored.agent, stored.drops, stored.minutes);
    }
}
