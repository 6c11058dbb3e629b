package plusward.visit;

import jakarta.persistence.CollectionTable;
import jakarta.persistence.Column;
import jakarta.persistence.ElementCollection;
import jakarta.persistence.Embedded;
import jakarta.persistence.Entity;
import jakarta.persistence.EntityListeners;
import jakarta.persistence.EnumType;
import jakarta.persistence.Enumerated;
import jakarta.persistence.GeneratedValue;
import jakarta.persistence.GenerationType;
import jakarta.persistence.Id;
import jakarta.persistence.JoinColumn;
import jakarta.persistence.MapKeyColumn;
import jakarta.persistence.MapKeyEnumerated;
import jakarta.persistence.SequenceGenerator;
import jakarta.persistence.Table;
import jakarta.persistence.Version;
import java.time.Instant;
import java.time.LocalDate;
import java.util.EnumMap;
import java.util.Map;
import java.util.Objects;
import org.hibernate.annotations.EmbeddedColumnNaming;
import org.hibernate.annotations.Fetch;
import org.hibernate.annotations.FetchMode;
import org.jspecify.annotations.Nullable;
import org.springframework.data.annotation.CreatedBy;
import org.springframework.data.annotation.CreatedDate;
import org.springframework.data.annotation.LastModifiedBy;
import org.springframework.data.annotation.LastModifiedDate;
import org.springframework.data.jpa.domain.support.AuditingEntityListener;
import plusward.exam.Examination;
import plusward.exam.FixationPreference;
import plusward.exam.Gaze;
import plusward.exam.Motility;
import plusward.exam.Stereo;
import plusward.exam.Turn;

/**
 * The row of a visit: one column for each part of each measure, empty where nothing was measured; and a row of its own for
 * the turn in each direction of gaze, which few visits have.
 */
@Entity
@Table(name = "visit")
@EntityListeners(AuditingEntityListener.class)
class VisitRow {

    @Id
    @GeneratedValue(strategy = GenerationType.SEQUENCE, generator = "visit_id")
    @SequenceGenerator(name = "visit_id", sequenceName = "visit_id", allocationSize = 50)
    private @Nullable Long id;

    @Column(updatable = false)
    private long childId;

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

    private LocalDate visitDate = LocalDate.EPOCH;
    private @Nullable String examiner;

    @Embedded
    @EmbeddedColumnNaming("%s")
    private @Nullable StoredGlasses glasses;

    @Embedded
    @EmbeddedColumnNaming("made_%s")
    private @Nullable StoredLensPair made;

    @Embedded
    @EmbeddedColumnNaming("acuity_%s")
    private @Nullable StoredAcuities acuities;

    @Embedded
    @EmbeddedColumnNaming("acuity_sc_%s")
    private @Nullable StoredAcuities acuitiesUncorrected;

    private @Nullable Boolean stereoNil;
    private @Nullable Integer stereoArcsec;

    @Embedded
    @EmbeddedColumnNaming("%s")
    private @Nullable StoredTurns turns;

    /** Read for all visits at hand at once. */
    @ElementCollection
    @CollectionTable(name = "visit_gaze", joinColumns = @JoinColumn(name = "visit_id"))
    @MapKeyColumn(name = "gaze")
    @MapKeyEnumerated(EnumType.STRING)
    @Fetch(FetchMode.SUBSELECT)
    private Map<Gaze, StoredTurn> gazes = new EnumMap<>(Gaze.class);

    @Embedded
    @EmbeddedColumnNaming("duction_%s")
    private @Nullable StoredDuctions ductions;

    @Enumerated(EnumType.STRING)
    private @Nullable FixationPreference fixation;

    @Embedded
    @EmbeddedColumnNaming("cycloplegic_%s")
    private @Nullable StoredCycloplegic cycloplegic;

    @Embedded
    @EmbeddedColumnNaming("manifest_%s")
    private @Nullable StoredEyes manifest;

    @Embedded
    @EmbeddedColumnNaming("segment_%s")
    private @Nullable StoredSegment segment;

    private @Nullable Double pdMm;

    @Embedded
    @EmbeddedColumnNaming("ordered_%s")
    private @Nullable StoredLensPair ordered;

    private @Nullable Integer nextVisitWeeks;
    private @Nullable String note;

    /** For the persistence framework. */
    protected VisitRow() {}

    VisitRow(long childId, Examination examination) {
        this.childId = childId;
        become(examination);
    }

    /** Takes every measure from the examination; what it lacks becomes empty. */
    final void become(Examination examination) {
        visitDate = examination.date();
        examiner = examination.examiner();
        glasses = StoredGlasses.of(examination.glasses());
        made = StoredLensPair.of(examination.made());
        acuities = StoredAcuities.of(examination.acuities());
        acuitiesUncorrected = StoredAcuities.of(examination.acuitiesUncorrected());
        take(examination.stereo());
        turns = StoredTurns.of(examination.turns());
        take(examination.motility());
        cycloplegic = StoredCycloplegic.of(examination.cycloplegic());
        manifest = StoredEyes.of(examination.manifest());
        segment = StoredSegment.of(examination.segment());
        pdMm = StoredSegment.amount(examination.pupilDistance());
        ordered = StoredLensPair.of(examination.ordered());
        nextVisitWeeks = examination.nextVisitWeeks();
        note = examination.note();
    }

    private void take(@Nullable Stereo stereo) {
        stereoNil = stereo == null ? null : stereo.equals(Stereo.NIL);
        stereoArcsec = stereo == null ? null : stereo.finest();
    }

    /** A collection that did not change is left alone, or the row would count as changed. */
    private void take(Motility motility) {
        ductions = StoredDuctions.of(motility.ductions());
        fixation = motility.fixation();
        Map<Gaze, StoredTurn> measured = new EnumMap<>(Gaze.class);
        motility.gazes().forEach((gaze, turn) -> measured.put(gaze, Objects.requireNonNull(StoredTurn.of(turn))));
        if (!measured.equals(gazes)) {
            gazes.clear();
            gazes.putAll(measured);
        }
    }

    private Motility motility() {
        Map<Gaze, Turn> measured = new EnumMap<>(Gaze.class);
        gazes.forEach((gaze, stored) -> measured.put(gaze, Objects.requireNonNull(StoredTurn.turn(stored))));
        return new Motility(measured, StoredDuctions.ductions(ductions), fixation);
    }

    boolean isAt(int expected) {
        return version == expected;
    }

    long id() {
        return Objects.requireNonNull(id);
    }

    long childId() {
        return childId;
    }

    Examination examination() {
        return new Examination(
                visitDate,
                examiner,
                StoredGlasses.glasses(glasses),
                StoredLensPair.pair(made),
                StoredAcuities.acuities(acuities),
                StoredAcuities.acuities(acuitiesUncorrected),
                stereoNil == null ? null : new Stereo(stereoArcsec),
                StoredTurns.turns(turns),
                motility(),
                StoredCycloplegic.cycloplegic(cycloplegic),
                StoredEyes.lenses(manifest),
                StoredSegment.segment(segment),
                StoredSegment.length(pdMm),
                StoredLensPair.pair(ordered),
                nextVisitWeeks,
                note);
    }

    RecordedVisit recorded() {
        return new RecordedVisit(
                Objects.requireNonNull(id),
                version,
                examination(),
                createdBy,
                Objects.requireNonNull(createdAt),
                changedBy,
                Objects.requireNonNull(changedAt));
    }
}
