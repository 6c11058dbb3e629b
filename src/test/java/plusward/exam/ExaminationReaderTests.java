package plusward.exam;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.stream.Stream;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.optics.Dioptres;
import plusward.optics.Lens;
import plusward.optics.Millimetres;
import plusward.optics.PrismDioptres;

class ExaminationReaderTests {

    private static final LocalDate DATE = LocalDate.of(2026, 3, 14);

    /** One text for every field, each different from the others of its kind, so that none can stand in for another. */
    private static final Map<Field, String> FULL = new EnumMap<>(Map.ofEntries(
            Map.entry(Field.VISIT_DATE, "2026-03-14"),
            Map.entry(Field.EXAMINER, "D. Osterlund"),
            Map.entry(Field.WEAR_HOURS, "7.5"),
            Map.entry(Field.WORN_RIGHT, "+3.00 -0.25 x 10"),
            Map.entry(Field.WORN_LEFT, "+3.25 -0.25 x 20"),
            Map.entry(Field.WORN_ADD, "+3.00"),
            Map.entry(Field.WORN_SINCE, "2025-12-01"),
            Map.entry(Field.MADE_RIGHT, "+3.50 -0.25 x 30"),
            Map.entry(Field.MADE_LEFT, "+3.75 -0.25 x 40"),
            Map.entry(Field.MADE_ADD, "+2.95"),
            Map.entry(Field.CYCLOPLEGIC_RIGHT, "+4.00 -0.25 x 50"),
            Map.entry(Field.CYCLOPLEGIC_LEFT, "+4.25 -0.25 x 60"),
            Map.entry(Field.CYCLOPLEGIC_AGENT, "atropine"),
            Map.entry(Field.MANIFEST_RIGHT, "+4.50 -0.25 x 70"),
            Map.entry(Field.MANIFEST_LEFT, "+4.75 -0.25 x 80"),
            Map.entry(Field.TURN_SC_DISTANCE, "ET 31"),
            Map.entry(Field.TURN_SC_NEAR, "ET 32"),
            Map.entry(Field.TURN_CC_DISTANCE, "E(T) 13"),
            Map.entry(Field.TURN_CC_NEAR, "E 14 RHT 2"),
            Map.entry(Field.TURN_ADD_NEAR, "X 5"),
            Map.entry(Field.TRIAL_PLUS, "+1.00"),
            Map.entry(Field.TURN_TRIAL_NEAR, "ortho"),
            Map.entry(Field.SEGMENT_STYLE, "executive"),
            Map.entry(Field.SEGMENT_RIGHT_MM, "-1.5"),
            Map.entry(Field.SEGMENT_LEFT_MM, "+0.25"),
            Map.entry(Field.PUPIL_MM, "4.0"),
            Map.entry(Field.PD_MM, "51.5"),
            Map.entry(Field.ACUITY_RIGHT, "20/25"),
            Map.entry(Field.ACUITY_LEFT, "20/32-2"),
            Map.entry(Field.ACUITY_BOTH, "20/20"),
            Map.entry(Field.ACUITY_SC_RIGHT, "20/40"),
            Map.entry(Field.ACUITY_SC_LEFT, "20/50"),
            Map.entry(Field.ACUITY_SC_BOTH, "CF"),
            Map.entry(Field.STEREO_ARCSEC, "nil"),
            Map.entry(Field.ORDERED_RIGHT, "+5.00 -0.25 x 90"),
            Map.entry(Field.ORDERED_LEFT, "+5.25 -0.25 x 100"),
            Map.entry(Field.ORDERED_ADD, "+2.50"),
            Map.entry(Field.NEXT_VISIT_WEEKS, "12"),
            Map.entry(Field.TURN_CC_UP, "ET 21"),
            Map.entry(Field.TURN_CC_DOWN, "ET 22"),
            Map.entry(Field.TURN_CC_RIGHT_GAZE, "ET 23 RHT 3"),
            Map.entry(Field.TURN_CC_LEFT_GAZE, "ET 24"),
            Map.entry(Field.DUCTIONS, "right abduction, left elevation"),
            Map.entry(Field.FIXATION_PREFERENCE, "prefers right"),
            Map.entry(Field.CYCLOPLEGIC_DROPS, "2"),
            Map.entry(Field.CYCLOPLEGIC_MINUTES, "40"),
            Map.entry(Field.SEGMENT_HEIGHT_RIGHT_MM, "18.5"),
            Map.entry(Field.SEGMENT_HEIGHT_LEFT_MM, "19.25"),
            Map.entry(Field.PUPIL_HEIGHT_RIGHT_MM, "20.0"),
            Map.entry(Field.PUPIL_HEIGHT_LEFT_MM, "19.0"),
            Map.entry(Field.NOTE, "Straight with the glasses.\nTwo lines.")));

    @Test
    void everyFieldIsReadAndWrittenBackAsItWas() {
        assertThat(FULL).hasSameSizeAs(Field.values());
        assertThat(ExaminationWriter.write(read(FULL))).isEqualTo(FULL);
    }

    @Test
    void refractionsGoToTheirPlaces() {
        Examination visit = read(FULL);
        assertThat(visit.date()).isEqualTo(DATE);
        assertThat(visit.examiner()).isEqualTo("D. Osterlund");
        assertThat(visit.glasses().asOrdered().lenses())
                .isEqualTo(new PerEye<>(Lens.of(3, -0.25, 10), Lens.of(3.25, -0.25, 20)));
        assertThat(visit.glasses().asOrdered().add()).isEqualTo(Dioptres.of(3));
        assertThat(visit.glasses().since()).isEqualTo(LocalDate.of(2025, 12, 1));
        assertThat(visit.glasses().wear()).isEqualTo(HoursPerDay.of(7.5));
        assertThat(visit.made().lenses().left()).isEqualTo(Lens.of(3.75, -0.25, 40));
        assertThat(visit.cycloplegic().refraction().right()).isEqualTo(Lens.of(4, -0.25, 50));
        assertThat(visit.cycloplegic().agent()).isEqualTo(CycloplegicAgent.ATROPINE);
        assertThat(visit.manifest().left()).isEqualTo(Lens.of(4.75, -0.25, 80));
        assertThat(visit.ordered().add()).isEqualTo(Dioptres.of(2.5));
        assertThat(visit.nextVisit()).isEqualTo(LocalDate.of(2026, 6, 6));
    }

    @Test
    void turnsAndTheOtherMeasuresGoToTheirPlaces() {
        Examination visit = read(FULL);
        assertThat(visit.turns().signedAt(TurnCondition.SC_DISTANCE)).isEqualTo(PrismDioptres.of(31));
        assertThat(visit.turns().signedAt(TurnCondition.SC_NEAR)).isEqualTo(PrismDioptres.of(32));
        assertThat(visit.turns().signedAt(TurnCondition.CC_DISTANCE)).isEqualTo(PrismDioptres.of(13));
        assertThat(visit.turns().signedAt(TurnCondition.CC_NEAR)).isEqualTo(PrismDioptres.of(14));
        assertThat(visit.turns().signedAt(TurnCondition.ADD_NEAR)).isEqualTo(PrismDioptres.of(-5));
        assertThat(visit.turns().signedAt(TurnCondition.TRIAL_NEAR)).isEqualTo(PrismDioptres.ZERO);
        assertThat(visit.turns().trialPlus()).isEqualTo(Dioptres.of(1));
        assertThat(visit.segment().top()).isEqualTo(new PerEye<>(Millimetres.of(-1.5), Millimetres.of(0.25)));
        assertThat(visit.segment().pupil()).isEqualTo(Millimetres.of(4));
        assertThat(visit.pupilDistance()).isEqualTo(Millimetres.of(51.5));
        assertThat(visit.acuities().each().left()).hasToString("20/32-2");
        assertThat(visit.acuitiesUncorrected().both()).hasToString("CF");
        assertThat(visit.stereo()).isEqualTo(Stereo.NIL);
    }

    @Test
    void movementsDropsAndHeightsGoToTheirPlaces() {
        Examination visit = read(FULL);
        assertThat(visit.motility().signedAt(Gaze.UP)).isEqualTo(PrismDioptres.of(21));
        assertThat(visit.motility().signedAt(Gaze.DOWN)).isEqualTo(PrismDioptres.of(22));
        assertThat(visit.motility().at(Gaze.RIGHT)).hasToString("ET 23 RHT 3");
        assertThat(visit.motility().signedAt(Gaze.LEFT)).isEqualTo(PrismDioptres.of(24));
        assertThat(visit.motility().ductions())
                .isEqualTo(new Ductions(Set.of(Duction.ABDUCTION), Set.of(Duction.ELEVATION)));
        assertThat(visit.motility().fixation()).isEqualTo(FixationPreference.PREFERS_RIGHT);
        assertThat(visit.cycloplegic().drops()).isEqualTo(2);
        assertThat(visit.cycloplegic().minutes()).isEqualTo(40);
        assertThat(visit.segment().heights().line())
                .isEqualTo(new PerEye<>(Millimetres.of(18.5), Millimetres.of(19.25)));
        assertThat(visit.segment().heights().pupil()).isEqualTo(new PerEye<>(Millimetres.of(20), Millimetres.of(19)));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', nullValues = "-", textBlock = """
            offset (mm) | line (mm) | pupil (mm) | top (mm) | source
            -           | 18.5      | 20         | -1.5     | 18.5 - 20.0 = -1.5
            -           | 21        | 20.25      | +0.75    | 21.0 - 20.25 = +0.75
            -           | 20        | 20         | 0.0      | level with the pupil centre
            -           | 0         | 20         | -20.0    | 20 mm is the farthest
            -1.5        | 18.5      | 20         | -1.5     | both, and they agree
            -1.55       | 18.5      | 20         | -1.55    | 0.05 mm apart: the offset as it was measured
            -1.45       | 18.5      | 20         | -1.45    | 0.05 mm apart the other way
            -1.5        | 18.5      | -          | -1.5     | the pupil height is missing
            -           | 18.5      | -          | -        | one height is no offset
            -           | -         | 20         | -        | one height is no offset
            """)
    void theTopOfTheSegmentIsTheOffsetOrWhatTheHeightsGive(
            String offset, String line, String pupil, String top, String source) {
        Examination right = read(heights("RIGHT", offset, line, pupil));
        Examination left = read(heights("LEFT", offset, line, pupil));
        assertThat(right.segment().top().right())
                .as(source)
                .isEqualTo(left.segment().top().left());
        assertThat(right.segment().top().left()).isNull();
        assertThat(left.segment().top().left())
                .as(source)
                .isEqualTo(top == null ? null : Millimetres.of(Double.parseDouble(top)));
        assertThat(ExaminationWriter.write(right).get(Field.SEGMENT_RIGHT_MM))
                .as("what follows from the heights is not written as if it had been measured")
                .isEqualTo(offset);
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', nullValues = "-", textBlock = """
            offset (mm) | line (mm) | pupil (mm) | refused field   | problem  | sentence holds | source
            -1.56       | 18.5      | 20         | SEGMENT_        | conflict | -1.56, -1.5    | 0.06 mm apart
            -1.44       | 18.5      | 20         | SEGMENT_        | conflict | -1.44, -1.5    | 0.06 mm apart the other way
            +1.5        | 18.5      | 20         | SEGMENT_        | conflict | +1.5, -1.5     | the sign of the offset
            -           | 0         | 20.01      | SEGMENT_HEIGHT_ | range    | 0, -20.01      | just farther than 20 mm
            -           | 40.01     | 20         | SEGMENT_HEIGHT_ | range    | 40.01, +20.01  | just farther than 20 mm
            -1          | 0         | 20.01      | SEGMENT_HEIGHT_ | range    | 0, -20.01      | heights first
            """)
    void anOffsetAndHeightsThatCannotBothBeTrueAreRefused(
            String offset, String line, String pupil, String field, String problem, String values, String source) {
        for (String eye : List.of("RIGHT", "LEFT")) {
            ExaminationReader.Result result = ExaminationReader.read(heights(eye, offset, line, pupil));
            assertThat(result.examination()).isNull();
            assertThat(result.refusals()).as(source).hasSize(1);
            Refusal refusal = result.refusals().get(0);
            assertThat(refusal.field()).isEqualTo(Field.valueOf(field + eye + "_MM"));
            assertThat(refusal.problem().reason())
                    .isEqualTo(Reason.of("notation.segment-heights." + problem, (Object[]) values.split(", ", -1)));
        }
    }

    private static Map<Field, String> heights(String eye, String offset, String line, String pupil) {
        Map<Field, String> text = new EnumMap<>(Field.class);
        text.put(Field.VISIT_DATE, "2026-03-14");
        text.put(Field.valueOf("SEGMENT_" + eye + "_MM"), Objects.requireNonNullElse(offset, ""));
        text.put(Field.valueOf("SEGMENT_HEIGHT_" + eye + "_MM"), Objects.requireNonNullElse(line, ""));
        text.put(Field.valueOf("PUPIL_HEIGHT_" + eye + "_MM"), Objects.requireNonNullElse(pupil, ""));
        return text;
    }

    @Test
    void blankIsNotMeasured() {
        Map<Field, String> blank = new EnumMap<>(Field.class);
        for (Field field : Field.values()) {
            blank.put(field, " \u00a0\t");
        }
        blank.put(Field.VISIT_DATE, "2026-03-14");
        assertThat(read(blank)).isEqualTo(Examination.empty(DATE));
        assertThat(read(Map.of(Field.VISIT_DATE, "2026-03-14"))).isEqualTo(Examination.empty(DATE));
        assertThat(Examination.empty(DATE).nextVisit()).isNull();
    }

    @Test
    void zeroIsMeasured() {
        Examination visit = read(Map.of(
                Field.VISIT_DATE,
                "2026-03-14",
                Field.TURN_CC_NEAR,
                "ortho",
                Field.WORN_ADD,
                "0",
                Field.WEAR_HOURS,
                "0"));
        assertThat(visit.turns().signedAt(TurnCondition.CC_NEAR)).isEqualTo(PrismDioptres.ZERO);
        assertThat(visit.turns().signedAt(TurnCondition.CC_DISTANCE)).isNull();
        assertThat(visit.glasses().asOrdered().add()).isEqualTo(Dioptres.ZERO);
        assertThat(visit.glasses().wear()).isEqualTo(HoursPerDay.of(0));
        assertThat(ExaminationWriter.write(visit)).containsEntry(Field.WORN_ADD, "0.00");
    }

    @Test
    void everythingThatIsWrongComesAtOnceInTheOrderOfTheFields() {
        ExaminationReader.Result result = ExaminationReader.read(Map.of(
                Field.NOTE, "a\u0000", Field.WORN_LEFT, "3.50", Field.TURN_CC_DISTANCE, "ET' 6", Field.EXAMINER, "A"));
        assertThat(result.examination()).isNull();
        assertThat(result.refusals())
                .extracting(refusal -> refusal.field() + " " + refusal.problem().getMessage())
                .containsExactly(
                        "VISIT_DATE date.missing",
                        "WORN_LEFT lens.sign",
                        "TURN_CC_DISTANCE turn.prime",
                        "NOTE note.control");
    }

    @Test
    void aPrimeIsReadInEveryFieldForNear() {
        assertThat(ExaminationReader.read(Map.of(
                                Field.VISIT_DATE, "2026-03-14",
                                Field.TURN_SC_NEAR, "ET' 30",
                                Field.TURN_CC_NEAR, "ET' 30",
                                Field.TURN_ADD_NEAR, "ET' 30",
                                Field.TURN_TRIAL_NEAR, "ET' 30"))
                        .refusals())
                .isEmpty();
    }

    @Test
    void mirroredExchangesTheEyesEverywhere() {
        Map<Field, String> mirrored = ExaminationWriter.write(read(FULL).mirrored());
        assertThat(mirrored)
                .containsEntry(Field.WORN_RIGHT, "+3.25 -0.25 x 160")
                .containsEntry(Field.MADE_LEFT, "+3.50 -0.25 x 150")
                .containsEntry(Field.CYCLOPLEGIC_RIGHT, "+4.25 -0.25 x 120")
                .containsEntry(Field.MANIFEST_LEFT, "+4.50 -0.25 x 110")
                .containsEntry(Field.ORDERED_RIGHT, "+5.25 -0.25 x 80")
                .containsEntry(Field.SEGMENT_RIGHT_MM, "+0.25")
                .containsEntry(Field.ACUITY_RIGHT, "20/32-2")
                .containsEntry(Field.ACUITY_SC_LEFT, "20/40")
                .containsEntry(Field.TURN_CC_NEAR, "E 14 LHT 2")
                .containsEntry(Field.TURN_SC_NEAR, "ET 32")
                .containsEntry(Field.TURN_CC_UP, "ET 21")
                .containsEntry(Field.TURN_CC_RIGHT_GAZE, "ET 24")
                .containsEntry(Field.TURN_CC_LEFT_GAZE, "ET 23 LHT 3")
                .containsEntry(Field.DUCTIONS, "right elevation, left abduction")
                .containsEntry(Field.FIXATION_PREFERENCE, "prefers left")
                .containsEntry(Field.SEGMENT_HEIGHT_RIGHT_MM, "19.25")
                .containsEntry(Field.PUPIL_HEIGHT_LEFT_MM, "20.0");
    }

    @Test
    void everyVisitOfTheDemonstrationClinicIsRead() throws IOException {
        List<CSVRecord> rows = demonstrationVisits();
        assertThat(rows).hasSizeGreaterThan(200);
        assertThat(rows.stream().flatMap(ExaminationReaderTests::refusals)).isEmpty();
    }

    private static Stream<String> refusals(CSVRecord row) {
        Map<Field, String> fields = new EnumMap<>(Field.class);
        for (Field field : Field.values()) {
            fields.put(field, row.get(field.column()));
        }
        return ExaminationReader.read(fields).refusals().stream()
                .map(refusal -> row.getRecordNumber() + " " + refusal.field() + " "
                        + refusal.problem().getMessage() + ": "
                        + refusal.problem().read());
    }

    @Test
    void theFieldsAreTheColumnsOfATableOfVisitsInTheirOrder() throws IOException {
        List<String> columns = demonstrationVisits().get(0).getParser().getHeaderNames();
        assertThat(columns.subList(1, columns.size()))
                .containsExactlyElementsOf(
                        Arrays.stream(Field.values()).map(Field::column).toList());
    }

    @Test
    void aFieldIsFoundByItsColumn() {
        assertThat(Field.named("turn_cc_near")).contains(Field.TURN_CC_NEAR);
        assertThat(Field.named("TURN_CC_NEAR")).isEmpty();
        assertThat(Field.named("clinic_number")).isEmpty();
    }

    private static Examination read(Map<Field, String> fields) {
        ExaminationReader.Result result = ExaminationReader.read(fields);
        assertThat(result.refusals()).isEmpty();
        return result.examination();
    }

    private static List<CSVRecord> demonstrationVisits() throws IOException {
        CSVFormat withHeader = CSVFormat.RFC4180
                .builder()
                .setHeader()
                .setSkipHeaderRecord(true)
                .get();
        try (Reader file = new InputStreamReader(
                        ExaminationReaderTests.class.getResourceAsStream("/seed-data/visits.csv"),
                        StandardCharsets.UTF_8);
                CSVParser rows = CSVParser.parse(file, withHeader)) {
            return rows.getRecords();
        }
    }
}
