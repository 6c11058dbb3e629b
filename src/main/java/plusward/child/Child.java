package plusward.child;

import jakarta.persistence.Entity;
import jakarta.persistence.EntityListeners;
import jakarta.persistence.GeneratedValue;
import jakarta.persistence.GenerationType;
import jakarta.persistence.Id;
import jakarta.persistence.SequenceGenerator;
import jakarta.persistence.Version;
import java.time.Instant;
import java.time.LocalDate;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import org.springframework.data.annotation.CreatedBy;
import org.springframework.data.annotation.CreatedDate;
import org.springframework.data.annotation.LastModifiedBy;
import org.springframework.data.annotation.LastModifiedDate;
import org.springframework.data.jpa.domain.support.AuditingEntityListener;

/** The row of a child. Who wrote it and when is read in the database only. */
@Entity
@SuppressWarnings("UnusedVariable")
@EntityListeners(AuditingEntityListener.class)
class Child {

    @Id
    @GeneratedValue(strategy = GenerationType.SEQUENCE, generator = "child_id")
    @SequenceGenerator(name = "child_id", sequenceName = "child_id", allocationSize = 50)
    private @Nullable Long id;

    @Version
    private int version;

    @CreatedBy
    private @Nullable String createdBy;

    @CreatedDate
    private @Nullable Instant createdAt;

    @LastModifiedBy
    private @Nullable String changedBy;

    @LastModifiedDate
    private @Nullable Instant changedAt;

    private String clinicNumber = "";
    private @Nullable String givenName;
    private @Nullable String familyName;
    private LocalDate bornOn = LocalDate.EPOCH;
    private @Nullable Integer turnFirstSeenMonths;
    private String handoutLanguage = "";
    private @Nullable String note;

    /** For the persistence framework. */
    protected Child() {}

    Child(ChildDetails details) {
        become(details);
    }

    final void become(ChildDetails details) {
        clinicNumber = details.clinicNumber();
        givenName = details.givenName();
        familyName = details.familyName();
        bornOn = details.bornOn();
        turnFirstSeenMonths = details.turnFirstSeenMonths();
        handoutLanguage = details.handoutLanguage();
        note = details.note();
    }

    boolean isAt(int expected) {
        return version == expected;
    }

    String clinicNumber() {
        return clinicNumber;
    }

    ChildCard card() {
        return new ChildCard(
                Objects.requireNonNull(id),
                clinicNumber,
                givenName,
                familyName,
                bornOn,
                turnFirstSeenMonths,
                handoutLanguage,
                note,
                version);
    }
}
