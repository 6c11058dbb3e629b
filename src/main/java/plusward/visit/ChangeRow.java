package plusward.visit;

import jakarta.persistence.Column;
import jakarta.persistence.Entity;
import jakarta.persistence.EntityListeners;
import jakarta.persistence.EnumType;
import jakarta.persistence.Enumerated;
import jakarta.persistence.GeneratedValue;
import jakarta.persistence.GenerationType;
import jakarta.persistence.Id;
import jakarta.persistence.SequenceGenerator;
import jakarta.persistence.Table;
import java.time.Instant;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import org.springframework.data.annotation.CreatedBy;
import org.springframework.data.annotation.CreatedDate;
import org.springframework.data.jpa.domain.support.AuditingEntityListener;
import plusward.exam.Examination;
import plusward.exam.ExaminationWriter;
import plusward.exam.Field;
import plusward.rules.Suspicion;

/** The row of one changed or confirmed field. Rows are only added. */
@Entity
@Table(name = "visit_change")
@EntityListeners(AuditingEntityListener.class)
class ChangeRow {

    @Id
    @GeneratedValue(strategy = GenerationType.SEQUENCE, generator = "visit_change_id")
    @SequenceGenerator(name = "visit_change_id", sequenceName = "visit_change_id", allocationSize = 50)
    private @Nullable Long id;

    @SuppressWarnings("UnusedVariable") // read by the query for a visit's changes
    private long visitId;

    @Enumerated(EnumType.STRING)
    private VisitChange.Kind kind = VisitChange.Kind.CORRECTED;

    @Column(name = "field")
    private String column = "";

    private @Nullable String beforeText;
    private @Nullable String afterText;
    private @Nullable String why;

    @CreatedBy
    private @Nullable String createdBy;

    @CreatedDate
    private @Nullable Instant createdAt;

    /** For the persistence framework. */
    protected ChangeRow() {}

    private ChangeRow(long visitId, VisitChange.Kind kind, Field field) {
        this.visitId = visitId;
        this.kind = kind;
        this.column = field.column();
    }

    /** A row for each field that means something else than before. */
    static List<ChangeRow> between(long visitId, Examination before, Examination after, @Nullable String why) {
        Map<Field, String> old = ExaminationWriter.write(before);
        Map<Field, String> now = ExaminationWriter.write(after);
        VisitChange.Kind kind = why == null ? VisitChange.Kind.IMPORTED : VisitChange.Kind.CORRECTED;
        return Arrays.stream(Field.values())
                .filter(field -> !Objects.equals(old.get(field), now.get(field)))
                .map(field -> {
                    ChangeRow row = new ChangeRow(visitId, kind, field);
                    row.beforeText = old.get(field);
                    row.afterText = now.get(field);
                    row.why = why;
                    return row;
                })
                .toList();
    }

    static ChangeRow confirming(long visitId, Suspicion suspicion) {
        ChangeRow row = new ChangeRow(visitId, VisitChange.Kind.CONFIRMED, suspicion.field());
        row.afterText = suspicion.written();
        row.why = suspicion.code();
        return row;
    }

    VisitChange change() {
        return new VisitChange(
                Objects.requireNonNull(createdAt),
                createdBy,
                kind,
                Field.named(column).orElseThrow(),
                Objects.requireNonNullElse(beforeText, ""),
                Objects.requireNonNullElse(afterText, ""),
                Objects.requireNonNullElse(why, ""));
    }
}
