package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.time.LocalDate;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import java.util.stream.Stream;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;

class VisitModelTests {

    private static final Offset<Double> EXACT = within(1e-7);
    /** 95 % limits of one reading (PEDIG, Arch Ophthalmol 2009;127:59): distance to 20 Δ, near to 20 Δ, near over 20 Δ. */
    private static final double DISTANCE = 4.1;

    private static final double NEAR = 3.3;
    private static final double LARGE_NEAR = 8.3;

    private static final String[] FULL_PLUS_3 = {
        "cycloplegic_right=+3.00", "cycloplegic_left=+3.00", "worn_right=+3.00", "worn_left=+3.00"
    };

    /** Hyperopia +3.00, worn +3.00, add +2.00: needs 3 and 6 D without glasses, 0 and 3 with, 1 through the add. */
    @Test
    void the_worked_example_gives_base_2_slope_4_and_nothing_more_at_near() {
        VisitModel model = model(
                "worn_add=2.00",
                "turn_sc_distance=ET 14",
                "turn_sc_near=ET 26",
                "turn_cc_distance=E 2",
                "turn_cc_near=ET 14",
                "turn_add_near=E 6");
        assertThat(base(model)).isCloseTo(2, EXACT);
        assertThat(slope(model)).isCloseTo(4, EXACT);
        assertThat(nearExtra(model)).isCloseTo(0, EXACT);
        assertThat(model.readings().stream()
                        .map(reading -> reading.accommodation().amount()))
                .containsExactly(3.0, 6.0, 0.0, 3.0, 1.0);
        assertThat(model.notes()).isEmpty();
    }

    /**
     * A published examination item: +4.00 D of hyperopia, 25 Δ, AC/A 6, full plus leaves 1 Δ: 25 − 6 · 4. Near turns of 19
     * and 13 Δ through 3 and 2 D of need make the AC/A 6.
     */
    @Test
    void the_published_item_leaves_one_prism_dioptre_under_full_plus() {
        VisitModel model = VisitModel.at(CourseText.visit(
                "cycloplegic_right=+4.00",
                "cycloplegic_left=+4.00",
                "worn_right=+4.00",
                "worn_left=+4.00",
                "turn_sc_distance=ET 25",
                "turn_cc_near=ET 19",
                "trial_plus=1.00",
                "turn_trial_near=ET 13"));
        assertThat(slope(model)).isCloseTo(6, EXACT);
        assertThat(model.expectedAtDistance(Dioptres.ZERO).orElseThrow().value().amount())
                .isCloseTo(1, EXACT);
    }

    @Test
    void nearness_of_its_own_is_told_from_focusing() {
        VisitModel model = model("turn_sc_distance=ET 14", "turn_cc_distance=E 2", "turn_cc_near=ET 19");
        assertThat(slope(model)).isCloseTo((14 - 2) / 3.0, EXACT);
        assertThat(nearExtra(model)).isCloseTo(19 - (2 + 4 * 3), EXACT);
    }

    /** Two near readings give the slope (26 − 14)/3, its interval from 8.3 and 3.3 Δ in squares. */
    @Test
    void two_readings_give_the_slope_with_an_interval_from_both() {
        VisitModel model = model("turn_sc_near=ET 26", "turn_cc_near=ET 14");
        var slope = Objects.requireNonNull(model.perDioptre());
        double half = Math.sqrt(LARGE_NEAR * LARGE_NEAR + NEAR * NEAR) / 3;
        assertThat(slope.value().amount()).isCloseTo((26 - 14) / 3.0, EXACT);
        assertThat(slope.low().amount()).isCloseTo(4 - half, EXACT);
        assertThat(slope.high().amount()).isCloseTo(4 + half, EXACT);
    }

    /**
     * Three near readings that no line meets: 30, 12 and 6 Δ at 6, 3 and 1 D. By hand: weights 1/limit², the weighted means,
     * slope Σw(x − x̄)y / Σw(x − x̄)², half its interval 1/√Σw(x − x̄)².
     */
    @Test
    void each_reading_weighs_by_its_repeatability() {
        VisitModel model = model("worn_add=2.00", "turn_sc_near=ET 30", "turn_cc_near=ET 12", "turn_add_near=E 6");
        double large = 1 / (8.3 * 8.3);
        double small = 1 / (3.3 * 3.3);
        double mean = (large * 6 + small * 3 + small * 1) / (large + small + small);
        double squares =
                large * (6 - mean) * (6 - mean) + small * (3 - mean) * (3 - mean) + small * (1 - mean) * (1 - mean);
        double slope = (large * (6 - mean) * 30 + small * (3 - mean) * 12 + small * (1 - mean) * 6) / squares;
        var fitted = Objects.requireNonNull(model.perDioptre());
        assertThat(fitted.value().amount()).isCloseTo(slope, EXACT);
        assertThat(fitted.high().minus(fitted.value()).amount()).isCloseTo(1 / Math.sqrt(squares), EXACT);
    }

    /** Distance at 0 and 3 D: var(base) = s², cov = −s²/3, var(slope) = 2s²/9, with s = 4.1/1.96. */
    @Test
    void the_covariance_of_base_and_slope_is_that_of_the_hand_computed_line() {
        VisitModel model = model("turn_sc_distance=ET 14", "turn_cc_distance=E 2");
        double variance = DISTANCE * DISTANCE / (1.96 * 1.96);
        LineSpread spread = Objects.requireNonNull(model.spread());
        assertThat(spread.baseVariance()).isCloseTo(variance, EXACT);
        assertThat(spread.covariance()).isCloseTo(-variance / 3, EXACT);
        assertThat(spread.slopeVariance()).isCloseTo(2 * variance / 9, EXACT);
    }

    /** The line passes through both readings, and halfway its variance is half of one: ±4.1/√2. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            need (D) | expected (Δ) | half (Δ)        | source
            0        | 2            | 4.1             | at the reading with glasses
            1.5      | 8            | 2.8991378028648 | 4.1/√2, the mean of both readings
            3        | 14           | 4.1             | at the reading without
            """)
    void the_band_of_the_line_is_narrowest_between_its_readings(
            double need, double expected, double half, String source) {
        VisitModel model = model("turn_sc_distance=ET 14", "turn_cc_distance=E 2");
        var turn = model.expectedAtDistance(Dioptres.of(need)).orElseThrow();
        assertThat(turn.value().amount()).as(source).isCloseTo(expected, EXACT);
        assertThat(turn.high().minus(turn.value()).amount()).as(source).isCloseTo(half, EXACT);
        assertThat(turn.value().minus(turn.low()).amount()).as(source).isCloseTo(half, EXACT);
    }

    @Test
    void a_variance_is_never_below_nothing() {
        assertThat(new LineSpread(1, -1, 0.5).varianceAt(2)).isEqualTo(0);
        assertThat(new LineSpread(1, -1, 0.9).varianceAt(1)).isEqualTo(0);
        assertThat(new LineSpread(4, 0.5, 0.25).varianceAt(2)).isEqualTo(4 + 2 * 2 * 0.5 + 4 * 0.25);
    }

    /** Distance and near are two parallel lines: each parameter is there exactly when geometry gives it. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn  | turns                                        | told                | notes                   | why
            +3.00 | cc_near=E 14, trial_near=E 6                 | slope               | only-near               | base and nearExtra come together
            +3.00 | cc_near=E 14                                 |                     | only-near one-need      | one reading at near
            +3.00 | cc_distance=E 2                              | base                | only-distance one-need  | nothing to focus: the turn is the base
            +2.00 | cc_distance=E 2                              |                     | only-distance one-need  | base and slope come together
            +3.00 | cc_distance=E 2, sc_distance=E 14            | base slope          | only-distance           | a line at distance
            +3.00 | cc_distance=E 2, cc_near=E 14                | base                | one-need                | slope and nearExtra come together
            +2.00 | cc_distance=E 6, cc_near=E 18                |                     | one-need                | nothing comes alone
            +3.00 | cc_distance=E 2, trial_near=E 6              | base                | one-need                | needs 0 and 1 D
            +3.00 | cc_distance=E 2, cc_near=E 14, trial_near=E 6 | base slope nearExtra |                       | a line at near, a point at distance
            +3.00 | sc_distance=E 14, cc_distance=E 2, cc_near=E 14 | base slope nearExtra |                     | a line at distance, a point at near
            """)
    void what_the_turns_cannot_separate_is_absent_with_its_reason(
            String worn, String turns, String told, String notes, String why) {
        Stream<String> glasses = Stream.of(
                "cycloplegic_right=+3.00",
                "cycloplegic_left=+3.00",
                "worn_right=" + worn,
                "worn_left=" + worn,
                "trial_plus=2.00");
        Stream<String> readings = Arrays.stream(turns.split(", ")).map(turn -> "turn_" + turn);
        VisitModel model =
                VisitModel.at(CourseText.visit(Stream.concat(glasses, readings).toArray(String[]::new)));
        assertThat(told(model)).as(why).isEqualTo(Objects.requireNonNullElse(told, ""));
        assertThat(keys(model).replace("model.not-separable.", ""))
                .as(why)
                .isEqualTo(Objects.requireNonNullElse(notes, ""));
        assertThat(model.expectedAtDistance(Dioptres.of(1)).isPresent())
                .as(why)
                .isEqualTo(told(model).contains("base slope"));
    }

    /** Through a trial plus of 3.00 D near needs what distance does: what near adds shows though the slope does not. */
    @Test
    void equal_needs_at_both_distances_show_what_near_adds() {
        VisitModel model = model("turn_cc_distance=E 2", "trial_plus=3.00", "turn_trial_near=E 5");
        assertThat(told(model)).isEqualTo("base nearExtra");
        assertThat(nearExtra(model)).isCloseTo(5 - 2, EXACT);
        assertThat(keys(model)).isEqualTo("model.not-separable.one-need");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            with trial (Δ) | slope (Δ/D) | usable | notes                                             | source
            E 12           | -3          | false  | model.not-separable.only-near model.negative-slope | (6 - 12)/2
            E 6            | 0           | true   | model.not-separable.only-near                     | (6 - 6)/2
            E 5            | 0.5         | true   | model.not-separable.only-near                     | (6 - 5)/2
            """)
    void a_slope_below_nothing_is_reported_and_not_used(
            String trial, double slope, boolean usable, String notes, String source) {
        VisitModel model = model("turn_cc_near=E 6", "trial_plus=2.00", "turn_trial_near=" + trial);
        assertThat(slope(model)).as(source).isCloseTo(slope, EXACT);
        assertThat(model.usableSlope().isPresent()).as(source).isEqualTo(usable);
        assertThat(keys(model)).as(source).isEqualTo(notes);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            cycloplegic | left out                                                      | source
            +6.00       |                                                               | at +6.00
            +6.01       | model.left-out.high-hyperopia model.left-out.high-hyperopia   | over +6.00, both readings without glasses
            """)
    void without_glasses_high_hyperopia_is_left_out(String cycloplegic, String leftOut, String source) {
        Visit visit = CourseText.visit(
                "cycloplegic_right=" + cycloplegic,
                "worn_right=+6.00",
                "turn_sc_distance=ET 40",
                "turn_sc_near=ET 40",
                "turn_cc_distance=E 4",
                "turn_cc_near=E 8");
        FocusReadings readings = FocusReadings.at(visit);
        assertThat(keys(readings.leftOut())).as(source).isEqualTo(Objects.requireNonNullElse(leftOut, ""));
        assertThat(readings.readings()).as(source).hasSize(leftOut == null ? 4 : 2);
    }

    /** Three quarters of 15 − 0.25 · 12 is 9 D, which +6.00 of hyperopia needs at near without glasses (Hofstetter 1950). */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            days old | left out | source
            4382     | false    | 11.998 y: 9.0004 D can be asked
            4383     | true     | 12.0002 y: 8.9999 D cannot
            """)
    void more_focusing_than_a_child_of_that_age_can_sustain_is_left_out(int days, boolean leftOut, String source) {
        String born = CourseText.DAY.minusDays(days).toString();
        Course course = CourseText.course(born, """
                visit_date | cycloplegic_right | turn_sc_distance | turn_sc_near
                2025-03-14 | +6.00             | ET 40            | ET 40
                """);
        FocusReadings readings = FocusReadings.at(course.latest().orElseThrow());
        assertThat(readings.leftOut().stream().map(Reason::key))
                .as(source)
                .isEqualTo(leftOut ? List.of("model.left-out.beyond-amplitude") : List.of());
        assertThat(readings.readings()).as(source).hasSize(leftOut ? 1 : 2);
    }

    @Test
    void a_left_out_reading_is_said_with_its_numbers() {
        VisitModel model = VisitModel.at(CourseText.visit("cycloplegic_right=+7.00", "turn_sc_near=ET 40"));
        assertThat(model.notes())
                .containsExactly(
                        Reason.of(
                                "model.left-out.high-hyperopia",
                                Reason.of("condition.sc-near"),
                                Dioptres.of(7),
                                Dioptres.of(6)),
                        Reason.of("model.no-reading"));
        assertThat(told(model)).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn  | turn              | why
                  | turn_cc_distance  | no lens on record
                  | turn_cc_near      | no lens on record
            +3.00 | turn_add_near     | no add on record
            +3.00 | turn_trial_near   | no trial plus on record
            """)
    void a_reading_through_unknown_glass_is_left_out(String worn, String turn, String why) {
        Visit visit = CourseText.visit(
                "cycloplegic_right=+3.00", "worn_right=" + Objects.requireNonNullElse(worn, ""), turn + "=ET 12");
        assertThat(keys(VisitModel.at(visit).notes()))
                .as(why)
                .isEqualTo("model.left-out.unknown-need model.no-reading");
    }

    @Test
    void without_a_cycloplegic_refraction_there_is_no_model() {
        VisitModel model = VisitModel.at(CourseText.visit("worn_right=+3.00", "turn_cc_near=ET 12"));
        assertThat(keys(model)).isEqualTo("model.no-cycloplegic model.no-reading");
        assertThat(model.readings()).isEmpty();
    }

    @Test
    void without_a_turn_there_is_no_model() {
        assertThat(keys(model())).isEqualTo("model.no-reading");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            column           | H     | F     | need (D) | source
            turn_sc_distance | +4.00 | +3.00 | 4        | max(0, H)
            turn_sc_near     | +4.00 | +3.00 | 7        | max(0, H + 3)
            turn_cc_distance | +4.00 | +3.00 | 1        | max(0, H - F)
            turn_cc_distance | +3.00 | +4.00 | 0        | max(0, H - F)
            turn_cc_near     | +4.00 | +3.00 | 4        | max(0, H - F + 3)
            turn_add_near    | +4.00 | +3.00 | 1.5      | max(0, H - F - add + 3), add 2.50
            turn_trial_near  | +4.00 | +3.00 | 3        | max(0, H - F - trial plus + 3), trial plus 1.00
            turn_add_near    | +3.00 | +4.00 | 0        | never below 0
            """)
    void each_condition_needs_its_own_focusing(
            String column, String hyperopia, String worn, double need, String source) {
        Visit visit = CourseText.visit(
                "cycloplegic_left=" + hyperopia,
                "worn_left=" + worn,
                "worn_add=2.50",
                "trial_plus=1.00",
                column + "=ET 12");
        FocusReading reading = FocusReadings.at(visit).readings().get(0);
        assertThat(reading.accommodation()).as(source).isEqualTo(Dioptres.of(need));
        assertThat(reading.turn()).as(source).isEqualTo(PrismDioptres.of(12));
        assertThat(reading.isNear()).as(source).isEqualTo(column.endsWith("near"));
    }

    @Test
    void hyperopia_and_plus_are_the_means_of_the_eyes() {
        Visit visit = CourseText.visit(
                "cycloplegic_right=+3.00",
                "cycloplegic_left=+4.00 -1.00 x 90",
                "worn_right=+2.00",
                "worn_left=+3.00",
                "turn_cc_distance=E 4");
        assertThat(FocusReadings.at(visit).readings())
                .containsExactly(new FocusReading(
                        TurnCondition.CC_DISTANCE,
                        Dioptres.of((3.0 + 3.5) / 2 - (2.0 + 3.0) / 2),
                        PrismDioptres.of(4)));
    }

    @Test
    void the_weight_of_a_reading_is_one_over_its_variance() {
        FocusReading reading = new FocusReading(TurnCondition.CC_NEAR, Dioptres.of(3), PrismDioptres.of(12));
        assertThat(reading.weight()).isCloseTo(1.96 * 1.96 / (3.3 * 3.3), EXACT);
    }

    @Test
    void a_refraction_of_an_earlier_visit_serves_for_two_years() {
        String table = """
                visit_date | cycloplegic_right | worn_right | turn_cc_distance
                2023-03-14 | +3.00             |            |
                %s         |                   | +3.00      | E 2
                """;
        LocalDate last = LocalDate.parse("2025-03-14");
        Course inForce = CourseText.course("2019-05-02", table.formatted(last));
        Course tooOld = CourseText.course("2019-05-02", table.formatted(last.plusDays(1)));
        assertThat(told(VisitModel.at(inForce.latest().orElseThrow()))).isEqualTo("base");
        assertThat(keys(VisitModel.at(tooOld.latest().orElseThrow()))).startsWith("model.no-cycloplegic");
    }

    private static VisitModel model(String... entries) {
        return VisitModel.at(CourseText.visit(Stream.concat(Arrays.stream(FULL_PLUS_3), Arrays.stream(entries))
                .toArray(String[]::new)));
    }

    private static double base(VisitModel model) {
        return Objects.requireNonNull(model.base()).value().amount();
    }

    private static double slope(VisitModel model) {
        return Objects.requireNonNull(model.perDioptre()).value().amount();
    }

    private static double nearExtra(VisitModel model) {
        return Objects.requireNonNull(model.nearExtra()).value().amount();
    }

    private static String told(VisitModel model) {
        return Stream.of(
                        model.base() == null ? "" : "base",
                        model.perDioptre() == null ? "" : "slope",
                        model.nearExtra() == null ? "" : "nearExtra")
                .filter(name -> !name.isEmpty())
                .reduce((one, other) -> one + " " + other)
                .orElse("");
    }

    private static String keys(VisitModel model) {
        return keys(model.notes());
    }

    private static String keys(List<Reason> reasons) {
        return String.join(" ", reasons.stream().map(Reason::key).toList());
    }
}
