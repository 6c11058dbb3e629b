package plusward.visit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.tuple;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.jpa.test.autoconfigure.TestEntityManager;
import org.springframework.context.annotation.Import;
import org.springframework.dao.DataIntegrityViolationException;
import org.springframework.dao.OptimisticLockingFailureException;
import org.springframework.jdbc.core.JdbcTemplate;
import org.springframework.test.context.transaction.TestTransaction;
import org.springframework.transaction.annotation.Transactional;
import plusward.child.ChildCard;
import plusward.child.ChildDetails;
import plusward.child.Children;
import plusward.course.CourseText;
import plusward.exam.Examination;
import plusward.exam.ExaminationReader;
import plusward.exam.ExaminationWriter;
import plusward.exam.Field;
import plusward.exam.Generator;
import plusward.exam.Reason;
import plusward.rules.Suspicion;

/** What storing visits must hold on every database. */
@Import({Children.class, Visits.class})
@Transactional
abstract class VisitsContract {

    static final LocalDate DAY = LocalDate.parse("2026-03-09");

    @Autowired
    Children children;

    @Autowired
    Visits visits;

    @Autowired
    TestEntityManager persistence;

    @Autowired
    JdbcTemplate database;

    ChildCard child(String clinicNumber) {
        LocalDate born = LocalDate.parse("2019-05-02");
        return children.add(new ChildDetails(clinicNumber, "Mara", "Ellwood", born, 30, "en", null));
    }

    RecordedVisit reread(ChildCard child, RecordedVisit visit) {
        persistence.clear();
        return visits.find(child, visit.id()).orElseThrow();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
        # field            | typed                    | comes back as
        worn_right         | +4.00 -0.50 x 90         | +4.00 -0.50 x 90
        worn_left          | +3.00 +1.00 x 0          | +3.00 +1.00 x 180
        made_right         | plano                    | plano
        made_left          | -0.13 -0.07 x 1          | -0.13 -0.07 x 1
        cycloplegic_left   | +30.00 -15.00 x 179      | +30.00 -15.00 x 179
        worn_add           | 2.5                      | +2.50
        ordered_add        | 0                        | 0.00
        wear_hours         | 7.25                     | 7.25
        worn_since         | 2025-12-01               | 2025-12-01
        turn_sc_near       | ET 30+25                 | ET 30+25
        turn_cc_distance   | ET 12.5 RHT 4            | ET 12.5 RHT 4
        turn_cc_near       | LH(T) 3+2                | LH(T) 3+2
        turn_add_near      | ortho LH 0               | ortho LH 0
        turn_trial_near    | X 4                      | X 4
        turn_sc_distance   | ortho                    | ortho
        trial_plus         | +3                       | +3.00
        acuity_right       | 20/25-2                  | 20/25-2
        acuity_left        | 6/7.5                    | 6/7.5
        acuity_both        | 0.10 logMAR              | 0.10 logMAR
        acuity_sc_right    | fixes and follows        | fixes and follows
        acuity_sc_left     | nlp                      | NLP
        acuity_sc_both     | .8                       | .8
        stereo_arcsec      | nil                      | nil
        stereo_arcsec      | 400                      | 400
        segment_style      | Flat-top 28              | flat-top 28
        segment_right_mm   | -3.25                    | -3.25
        segment_left_mm    | 0                        | 0.0
        pupil_mm           | 4.5                      | 4.5
        pd_mm              | 53                       | 53.0
        cycloplegic_agent  | atropine                 | atropine
        turn_cc_up         | ET 30+25                 | ET 30+25
        turn_cc_down       | ortho                    | ortho
        turn_cc_right_gaze | X(T) 12.5 LH 3           | X(T) 12.5 LH 3
        turn_cc_left_gaze  | RHT 3+2                  | RHT 3+2
        ductions           | normal                   | normal
        ductions           | OS elevation, r abduction | right abduction, left elevation
        fixation_preference | Prefers left            | prefers left
        cycloplegic_drops  | 2                        | 2
        cycloplegic_minutes | 1440                    | 1440
        segment_height_right_mm | 18.5                | 18.5
        segment_height_left_mm | 0                    | 0.0
        pupil_height_right_mm | 60                    | 60.0
        pupil_height_left_mm | 19.25                  | 19.25
        next_visit_weeks   | 0                        | 0
        examiner           | עדה ‮R                    | עדה ‮R
        note               | two × ½ “lines” 𝛂        | two × ½ “lines” 𝛂
        """)
    void everyMeasureComesBackAsItWasTyped(String field, String typed, String expected) {
        ChildCard child = child("A-1");
        Map<Field, String> text =
                Map.of(Field.VISIT_DATE, "2026-03-09", Field.named(field).orElseThrow(), typed);
        Examination read = ExaminationReader.read(text).examination();
        Examination back = reread(child, visits.record(child, read, List.of())).examination();
        assertThat(back).isEqualTo(read);
        assertThat(ExaminationWriter.write(back).get(Field.named(field).orElseThrow()))
                .isEqualTo(expected);
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void anyVisitComesBackEqual(long seed) {
        ChildCard child = child("A-1");
        Generator generator = new Generator(seed);
        for (int i = 0; i < 25; i++) {
            Examination examination = generator.examination();
            visits.bringIn(child, List.of(examination));
            persistence.clear();
            assertThat(visits.findOn(child, examination.date()).orElseThrow().examination())
                    .isEqualTo(examination);
        }
    }

    @Test
    void ofManyWhoCorrectTheSameStateAtOnceExactlyOneSucceeds() throws Exception {
        TestTransaction.end();
        ChildCard child = child("C-1");
        RecordedVisit visit = visits.record(child, Examination.empty(DAY), List.of());
        ExecutorService people = Executors.newFixedThreadPool(8);
        List<Future<Boolean>> corrections = people.invokeAll(IntStream.range(1, 9)
                .mapToObj(days -> (Callable<Boolean>) () -> corrects(child, visit, DAY.plusDays(days)))
                .toList());
        people.shutdown();
        long succeeded = 0;
        for (Future<Boolean> each : corrections) {
            succeeded += each.get() ? 1 : 0;
        }
        assertThat(succeeded).isEqualTo(1);
        assertThat(visits.find(child, visit.id()).orElseThrow().version()).isEqualTo(visit.version() + 1);
        database.update("delete from visit_change where visit_id = ?", visit.id());
        database.update("delete from visit where child_id = ?", child.id());
        database.update("delete from child where id = ?", child.id());
    }

    private static Correction correction(RecordedVisit visit, Examination examination) {
        return new Correction(visit.id(), visit.version(), examination, "typed wrong", List.of());
    }

    private boolean corrects(ChildCard child, RecordedVisit visit, LocalDate day) {
        try {
            visits.correct(child, correction(visit, Examination.empty(day)));
            return true;
        } catch (OptimisticLockingFailureException overtaken) {
            return false;
        }
    }

    @Test
    void aVisitWithNothingMeasuredComesBackWithNothingMeasured() {
        ChildCard child = child("A-1");
        Examination nothing = Examination.empty(DAY);
        assertThat(reread(child, visits.record(child, nothing, List.of())).examination())
                .isEqualTo(nothing);
    }

    @Test
    void keepsWhoAndWhenFromTheFirstEntryThroughCorrections() {
        ChildCard child = child("A-1");
        RecordedVisit first = visits.record(child, Examination.empty(DAY), List.of());
        assertThat(first.isChanged()).isFalse();
        assertThat(first.enteredAt()).isEqualTo(first.changedAt());
        RecordedVisit corrected = visits.correct(child, correction(first, Examination.empty(DAY.plusDays(1))));
        assertThat(corrected.isChanged()).isTrue();
        assertThat(corrected.enteredAt()).isEqualTo(first.enteredAt());
        assertThat(corrected.changedAt()).isAfterOrEqualTo(first.changedAt());
    }

    @Test
    void refusesACorrectionOfAnOlderStateAndKeepsTheLaterOne() {
        ChildCard child = child("A-1");
        RecordedVisit first = visits.record(child, Examination.empty(DAY), List.of());
        visits.correct(child, correction(first, Examination.empty(DAY.plusDays(1))));
        assertThatThrownBy(() -> visits.correct(child, correction(first, Examination.empty(DAY.plusDays(2)))))
                .isInstanceOf(OptimisticLockingFailureException.class);
        assertThat(reread(child, first).date()).isEqualTo(DAY.plusDays(1));
    }

    @Test
    void keepsForEachCorrectedFieldWhatItWasAndWhy() {
        ChildCard child = child("A-1");
        RecordedVisit first = visits.record(
                child, CourseText.exam("visit_date=" + DAY, "turn_cc_near=ET 12", "worn_right=+3.00"), List.of());
        assertThat(visits.changesOf(first)).isEmpty();
        Examination after = CourseText.exam("visit_date=" + DAY, "turn_cc_near=ET 14", "note=seen again");
        visits.correct(child, new Correction(first.id(), 0, after, "read twice", List.of()));
        assertThat(visits.changesOf(first))
                .extracting(
                        VisitChange::kind,
                        VisitChange::field,
                        VisitChange::before,
                        VisitChange::after,
                        VisitChange::why)
                .containsExactlyInAnyOrder(
                        tuple(VisitChange.Kind.CORRECTED, Field.WORN_RIGHT, "+3.00", "", "read twice"),
                        tuple(VisitChange.Kind.CORRECTED, Field.TURN_CC_NEAR, "ET 12", "ET 14", "read twice"),
                        tuple(VisitChange.Kind.CORRECTED, Field.NOTE, "", "seen again", "read twice"));
        assertThat(visits.changesOf(first))
                .allSatisfy(change -> assertThat(change.at()).isAfterOrEqualTo(first.enteredAt()));
    }

    @Test
    void anOvertakenCorrectionLeavesNoTrace() {
        ChildCard child = child("A-1");
        RecordedVisit first =
                visits.record(child, CourseText.exam("visit_date=" + DAY, "turn_cc_near=ET 12"), List.of());
        Correction stale = new Correction(
                first.id(), 7, CourseText.exam("visit_date=" + DAY, "turn_cc_near=ET 14"), "read twice", List.of());
        assertThatThrownBy(() -> visits.correct(child, stale)).isInstanceOf(OptimisticLockingFailureException.class);
        assertThat(visits.changesOf(first)).isEmpty();
    }

    @Test
    void keepsWhatWasAskedAboutAndConfirmed() {
        ChildCard child = child("A-1");
        Suspicion doubled =
                new Suspicion("turn-doubled", Field.TURN_CC_NEAR, "ET 30", Reason.of("suspicion.turn-doubled"));
        RecordedVisit first =
                visits.record(child, CourseText.exam("visit_date=" + DAY, "turn_cc_near=ET 30"), List.of(doubled));
        assertThat(visits.changesOf(first)).singleElement().satisfies(change -> {
            assertThat(change.kind()).isEqualTo(VisitChange.Kind.CONFIRMED);
            assertThat(change.after()).isEqualTo("ET 30");
            assertThat(change.why()).isEqualTo("turn-doubled");
        });
    }

    @Test
    void aVisitThatAFileChangesKeepsWhatItWas() {
        ChildCard child = child("A-1");
        RecordedVisit first =
                visits.record(child, CourseText.exam("visit_date=" + DAY, "turn_cc_near=ET 12"), List.of());
        visits.bringIn(child, List.of(CourseText.exam("visit_date=" + DAY, "turn_cc_near=ET 14")));
        visits.bringIn(child, List.of(CourseText.exam("visit_date=" + DAY, "turn_cc_near=ET 14")));
        assertThat(visits.changesOf(first))
                .extracting(VisitChange::kind, VisitChange::before, VisitChange::after, VisitChange::why)
                .containsExactly(tuple(VisitChange.Kind.IMPORTED, "ET 12", "ET 14", ""));
    }

    @Test
    void refusesASecondVisitOnOneDay() {
        ChildCard child = child("A-1");
        visits.record(child, Examination.empty(DAY), List.of());
        assertThatThrownBy(() -> visits.record(child, Examination.empty(DAY), List.of()))
                .isInstanceOf(DataIntegrityViolationException.class);
    }

    @Test
    void findsNoVisitThroughAnotherChild() {
        RecordedVisit visit = visits.record(child("A-1"), Examination.empty(DAY), List.of());
        assertThat(visits.find(child("A-2"), visit.id())).isEmpty();
    }

    @Test
    void bringsInNewVisitsAndReplacesThoseOfAKnownDay() {
        ChildCard child = child("A-1");
        RecordedVisit known = visits.record(child, Examination.empty(DAY), List.of());
        Map<Field, String> text = Map.of(Field.VISIT_DATE, DAY.toString(), Field.TURN_CC_NEAR, "E 6");
        Examination richer = ExaminationReader.read(text).examination();
        visits.bringIn(child, List.of(richer, Examination.empty(DAY.plusDays(7))));
        assertThat(reread(child, known).examination()).isEqualTo(richer);
        assertThat(visits.courseOf(child).examinations()).hasSize(2);
    }

    @Test
    void bringingInTheSameTwiceChangesNothing() {
        ChildCard child = child("A-1");
        RecordedVisit known = reread(child, visits.record(child, Examination.empty(DAY), List.of()));
        visits.bringIn(child, List.of(Examination.empty(DAY)));
        assertThat(reread(child, known)).isEqualTo(known);
    }

    @Test
    void aReadingInADirectionOfGazeIsAddedChangedAndTakenAway() {
        ChildCard child = child("A-1");
        RecordedVisit none = visits.record(child, Examination.empty(DAY), List.of());
        RecordedVisit two = corrected(child, none, "ET 10", "ET 25");
        assertThat(two.version()).isEqualTo(none.version() + 1);
        RecordedVisit changed = corrected(child, two, "ET 12 RHT 2", "ET 25");
        assertThat(ExaminationWriter.write(changed.examination())).containsEntry(Field.TURN_CC_UP, "ET 12 RHT 2");
        RecordedVisit one = corrected(child, changed, "", "ET 25");
        assertThat(ExaminationWriter.write(one.examination()))
                .containsEntry(Field.TURN_CC_DOWN, "ET 25")
                .doesNotContainKey(Field.TURN_CC_UP);
        visits.bringIn(child, List.of(one.examination()));
        assertThat(reread(child, one)).isEqualTo(one);
    }

    private RecordedVisit corrected(ChildCard child, RecordedVisit visit, String up, String down) {
        Map<Field, String> text =
                Map.of(Field.VISIT_DATE, DAY.toString(), Field.TURN_CC_UP, up, Field.TURN_CC_DOWN, down);
        Examination examination = ExaminationReader.read(text).examination();
        return reread(child, visits.correct(child, correction(visit, examination)));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
        # constraint           | columns                                        | nonsense
        visit_gaze_known       | gaze, direction, phase, prism_pd               | 'FAR', 'INWARD', 'MANIFEST', 9
        visit_gaze_something   | gaze                                           | 'UP'
        visit_gaze_horizontal  | gaze, direction                                | 'UP', 'INWARD'
        visit_gaze_horizontal  | gaze, direction, phase, prism_pd               | 'UP', 'INWARD', 'MANIFEST', 0
        visit_gaze_horizontal  | gaze, direction, phase, prism_pd               | 'UP', 'INWARD', 'MANIFEST', 150.1
        visit_gaze_vertical    | gaze, vertical_higher, vertical_phase          | 'UP', 'RIGHT', 'MANIFEST'
        visit_gaze_vertical    | gaze, vertical_higher, vertical_phase, vertical_prism_pd | 'UP', 'UP', 'MANIFEST', 4
        """)
    void theDatabaseItselfRefusesNonsenseInADirectionOfGaze(String constraint, String columns, String nonsense) {
        RecordedVisit visit = visits.record(child("A-1"), Examination.empty(DAY), List.of());
        assertThatThrownBy(() -> database.update(
                        "insert into visit_gaze (visit_id, " + columns + ") values (?, " + nonsense + ")", visit.id()))
                .isInstanceOf(DataIntegrityViolationException.class)
                .satisfies(refusal -> assertThat(refusal.getMessage()).containsIgnoringCase(constraint));
    }

    @Test
    void handsOutTheCoursesOfSeveralChildren() {
        ChildCard one = child("A-1");
        ChildCard other = child("A-2");
        visits.record(one, Examination.empty(DAY), List.of());
        var courses = visits.coursesOf(List.of(one, other));
        assertThat(courses.get(one.id()).examinations()).hasSize(1);
        assertThat(courses.get(one.id()).patient()).isEqualTo(one.patient());
        assertThat(courses.get(other.id()).examinations()).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
        # constraint                | nonsense
        visit_worn_right            | worn_right_sphere_d = 3
        visit_worn_right            | worn_right_cylinder_d = -1
        visit_worn_right            | worn_right_sphere_d = 31, worn_right_cylinder_d = 0, worn_right_axis_deg = 180
        visit_worn_left             | worn_left_sphere_d = 3, worn_left_cylinder_d = -1, worn_left_axis_deg = 0
        visit_worn_left             | worn_left_sphere_d = 3, worn_left_cylinder_d = -1, worn_left_axis_deg = 181
        visit_worn_left             | worn_left_sphere_d = 3, worn_left_cylinder_d = 0, worn_left_axis_deg = 90
        visit_worn_add              | worn_add_d = 4.01
        visit_wear                  | wear_hours = 24.01
        visit_wear                  | wear_hours = -0.01
        visit_turn_cc_near          | turn_cc_near_prism_pd = 20
        visit_turn_cc_near          | turn_cc_near_direction = 'INWARD', turn_cc_near_phase = 'LATENT', turn_cc_near_prism_pd = -1
        visit_turn_cc_near          | turn_cc_near_direction = 'INWARD', turn_cc_near_phase = 'MANIFEST', turn_cc_near_prism_pd = 0
        visit_turn_cc_near          | turn_cc_near_direction = 'DOWN', turn_cc_near_phase = 'MANIFEST', turn_cc_near_prism_pd = 9
        visit_turn_cc_near          | turn_cc_near_other_prism_pd = 9
        visit_turn_cc_near_vertical | turn_cc_near_vertical_higher = 'RIGHT'
        visit_acuity_right          | acuity_right_written = '20/25'
        visit_acuity_right          | acuity_right_kind = 'CHART', acuity_right_written = '20/25'
        visit_acuity_right          | acuity_right_kind = 'CF', acuity_right_written = 'CF', acuity_right_size_logmar = 1
        visit_stereo                | stereo_nil = true, stereo_arcsec = 40
        visit_stereo                | stereo_arcsec = 40
        visit_pupil                 | segment_pupil_mm = 0.99
        visit_pd                    | pd_mm = 29.99
        visit_segment_right         | segment_right_mm = -20.01
        visit_next_visit            | next_visit_weeks = 261
        visit_cycloplegic_agent     | cycloplegic_agent = 'NONE'
        visit_cycloplegic_drops     | cycloplegic_drops = 0
        visit_cycloplegic_drops     | cycloplegic_drops = 11
        visit_cycloplegic_minutes   | cycloplegic_minutes = 1441
        visit_fixation              | fixation = 'RIGHT'
        visit_ductions              | duction_left_elevation = true
        visit_segment_height_left   | segment_height_left_mm = 60.01
        visit_pupil_height_right    | segment_pupil_height_right_mm = -0.01
        visit_segment_heights_right | segment_height_right_mm = 41, segment_pupil_height_right_mm = 20.99
        visit_segment_heights_left  | segment_left_mm = -1.56, segment_height_left_mm = 18.5, segment_pupil_height_left_mm = 20
        visit_date_plausible        | visit_date = date '1899-12-31'
        """)
    void theDatabaseItselfRefusesNonsense(String constraint, String nonsense) {
        RecordedVisit visit = visits.record(child("A-1"), Examination.empty(DAY), List.of());
        assertThatThrownBy(() -> database.update("update visit set " + nonsense + " where id = ?", visit.id()))
                .isInstanceOf(DataIntegrityViolationException.class)
                .satisfies(refusal -> assertThat(refusal.getMessage()).containsIgnoringCase(constraint));
    }
}
