package plusward.visit;

import jakarta.persistence.Embeddable;
import jakarta.persistence.EnumType;
import jakarta.persistence.Enumerated;
import org.jspecify.annotations.Nullable;
import plusward.exam.Acuity;
import plusward.optics.LogMar;

/** The columns of an acuity: its kind, the text as it was typed, and its size where it has one. */
@Embeddable
record StoredAcuity(
        @Enumerated(EnumType.STRING) Acuity.Kind kind,
        String written,
        @Nullable Double sizeLogmar) {

    static @Nullable StoredAcuity of(@Nullable Acuity acuity) {
        if (acuity == null) {
            return null;
        }
        LogMar size = acuity.size();
        return new StoredAcuity(acuity.kind(), acuity.written(), size == null ? null : size.amount());
    }

    static @Nullable Acuity acuity(@Nullable StoredAcuity stored) {
        return stored == null
                ? null
                : new Acuity(
                        stored.kind, stored.written, stored.sizeLogmar == null ? null : LogMar.of(stored.sizeLogmar));
    }
}
