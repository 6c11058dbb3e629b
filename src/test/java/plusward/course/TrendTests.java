package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.course.Trend.Point;
import plusward.exam.Eye;
import plusward.optics.Age;
import plusward.optics.Dioptres;

class TrendTests {

    /** NIST StRD, Norris: response and predictor, 36 pairs. */
    private static final String NORRIS = """
            0.1 0.2; 338.8 337.4; 118.1 118.2; 888.0 884.6; 9.2 10.1; 228.1 226.5; 668.5 666.3; 998.5 996.3; 449.1 448.6;
            778.9 777.0; 559.2 558.2; 0.3 0.4; 0.1 0.6; 778.1 775.5; 668.8 666.9; 339.3 338.0; 448.9 447.5; 10.8 11.6;
            557.7 556.0; 228.3 228.1; 998.0 995.8; 888.8 887.6; 119.6 120.2; 0.3 0.3; 0.6 0.3; 557.6 556.8; 339.3 339.1;
            888.0 887.2; 998.5 999.0; 778.9 779.0; 10.2 11.1; 117.6 118.3; 228.9 229.2; 668.4 669.1; 449.2 448.9; 0.2 0.5""";

    private static final double NORRIS_SLOPE = 1.00211681802045;
    private static final double NORRIS_SLOPE_SD = 0.429796848199937e-3;
    private static final double NORRIS_INTERCEPT = -0.262323073774029;
    private static final double NORRIS_RESIDUAL_SD = 0.884796396144373;

    /** 97.5 % point of t with 34 and with 1 degrees of freedom; the latter is tan(0.475 π). */
    private static final double T_34 = 2.0322445093;

    private static final double T_1 = Math.tan(0.475 * Math.PI);

    @Test
    void the_regression_agrees_with_the_certified_one_to_nine_digits() {
        Trend trend = Trend.through(norris());
        assertThat(trend.n()).isEqualTo(36);
        assertThat(trend.slope().value().amount()).isCloseTo(NORRIS_SLOPE, within(1e-9));
        assertThat(trend.fitted().amount()).isCloseTo(NORRIS_INTERCEPT + NORRIS_SLOPE * 0.2, within(1e-9));
        assertThat(trend.projected().value().amount()).isCloseTo(NORRIS_INTERCEPT + NORRIS_SLOPE * 1.5, within(1e-9));
    }

    @Test
    void its_slope_interval_agrees_with_the_certified_deviation() {
        Trend trend = Trend.through(norris());
        double half = T_34 * NORRIS_SLOPE_SD;
        assertThat(trend.slope().low().amount()).isCloseTo(NORRIS_SLOPE - half, within(2e-9));
        assertThat(trend.slope().high().amount()).isCloseTo(NORRIS_SLOPE + half, within(2e-9));
    }

    /** s√(1 + 1/n + (x − x̄)²/Sxx), where Sxx = (s / sd of the slope)². */
    @Test
    void its_prediction_interval_agrees_with_the_certified_deviations() {
        List<Point> points = norris();
        double mean = points.stream()
                .mapToDouble(point -> point.age().amount())
                .average()
                .orElseThrow();
        double sxx = Math.pow(NORRIS_RESIDUAL_SD / NORRIS_SLOPE_SD, 2);
        double half = T_34 * NORRIS_RESIDUAL_SD * Math.sqrt(1 + 1 / 36.0 + Math.pow(1.5 - mean, 2) / sxx);
        var projected = Trend.through(points).projected();
        assertThat(projected.high().minus(projected.value()).amount()).isCloseTo(half, within(1e-7));
        assertThat(projected.value().minus(projected.low()).amount()).isCloseTo(half, within(1e-7));
    }

    /**
     * +4.00, +3.00, +3.50 at 4, 5 and 6 years: slope (3.50 − 4.00)/2 = −0.25; fitted 3.75, 3.50, 3.25; residuals 0.25,
     * −0.50, 0.25, squares 0.375 on 1 degree of freedom; Sxx 2. At 7 years 3.00, 2 years from the mean.
     */
    @Test
    void three_refractions_give_the_hand_computed_line() {
        Trend trend = Trend.through(List.of(point(4, 4.00), point(5, 3.00), point(6, 3.50)));
        double slopeHalf = T_1 * Math.sqrt(0.375 / 2);
        double projectedHalf = T_1 * Math.sqrt(0.375 * (1 + 1 / 3.0 + 2 * 2 / 2.0));
        assertThat(trend.slope().value()).isEqualTo(DioptresPerYear.of(-0.25));
        assertThat(trend.slope().low().amount()).isCloseTo(-0.25 - slopeHalf, within(1e-8));
        assertThat(trend.slope().high().amount()).isCloseTo(-0.25 + slopeHalf, within(1e-8));
        assertThat(trend.fittedFrom()).isEqualTo(Age.of(4));
        assertThat(trend.fitted()).isEqualTo(Dioptres.of(3.75));
        assertThat(trend.projectedAge()).isEqualTo(Age.of(7));
        assertThat(trend.projected().value()).isEqualTo(Dioptres.of(3.00));
        assertThat(trend.projected().low().amount()).isCloseTo(3 - projectedHalf, within(1e-8));
        assertThat(trend.projected().high().amount()).isCloseTo(3 + projectedHalf, within(1e-8));
    }

    /** The residuals are 0, but each refraction was written to 0.25 D: an even error over one step, 0.25/√12. Sxx 2. */
    @Test
    void refractions_that_lie_on_a_line_are_no_more_certain_than_their_steps() {
        Trend trend = Trend.through(List.of(point(4, 3.00), point(5, 3.00), point(6, 3.00)));
        double slopeHalf = T_1 * 0.25 / Math.sqrt(12) / Math.sqrt(2);
        double projectedHalf = T_1 * 0.25 / Math.sqrt(12) * Math.sqrt(1 + 1 / 3.0 + 2 * 2 / 2.0);
        assertThat(trend.slope().high().amount()).isCloseTo(slopeHalf, within(1e-8));
        assertThat(trend.projected().high().amount()).isCloseTo(3 + projectedHalf, within(1e-8));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            second     | third      | third right | there | source
            2024-06-01 | 2025-01-15 | +3.00       | true  | three over a calendar year
            2024-06-01 | 2025-01-14 | +3.00       | false | a day less than a year
            2024-06-01 | 2025-01-15 |             | false | only two of this eye
            """)
    void it_takes_three_refractions_over_a_year(
            String second, String third, String thirdRight, boolean there, String source) {
        Course course =
                CourseText.course("2019-05-02", """
                visit_date | cycloplegic_right | cycloplegic_left
                2024-01-15 | +3.50             | +3.50
                %s         | +3.25 -0.50 x 90  | +3.00
                %s         | %s                | +3.00
                """.formatted(second, third, thirdRight == null ? "" : thirdRight));
        assertThat(Trend.at(course.latest().orElseThrow(), Eye.RIGHT).isPresent())
                .as(source)
                .isEqualTo(there);
    }

    @Test
    void each_eye_has_its_own_and_only_the_visits_up_to_here_count() {
        Course course = CourseText.course("2019-05-02", """
                visit_date | cycloplegic_right | cycloplegic_left | manifest_right
                2022-05-02 | +4.00             | +5.00            | +2.00
                2023-05-02 | +3.50             |                  | +2.00
                2024-05-02 | +3.00             | +5.00            | +2.00
                2025-05-02 | +6.00             | +5.00            | +2.00
                """);
        Visit third = course.visits().get(2);
        assertThat(Trend.at(third, Eye.RIGHT).orElseThrow().slope().value().amount())
                .isCloseTo(-0.5, within(1e-3));
        assertThat(Trend.at(third, Eye.LEFT)).isEmpty();
        Visit last = course.latest().orElseThrow();
        assertThat(Trend.at(last, Eye.RIGHT).orElseThrow().n()).isEqualTo(4);
        assertThat(Trend.at(last, Eye.LEFT).orElseThrow().slope().value()).isEqualTo(DioptresPerYear.ZERO);
    }

    @Test
    void a_yearly_change_prints_with_its_sign() {
        assertThat(DioptresPerYear.of(-0.12)).hasToString("-0.12");
        assertThat(DioptresPerYear.of(0.1)).hasToString("+0.10");
        assertThat(DioptresPerYear.ZERO).hasToString("0.00");
        assertThat(DioptresPerYear.ZERO.unit()).isEqualTo("D/y");
    }

    /** The certified pairs, the smallest predictor first and 0.5 last, so that the projection is to 1.5. */
    private static List<Point> norris() {
        return Stream.of(NORRIS.strip().split(";\\s*"))
                .map(pair -> pair.split(" "))
                .map(pair -> point(Double.parseDouble(pair[1]), Double.parseDouble(pair[0])))
                .toList();
    }

    private static Point point(double age, double dioptres) {
        return new Point(Age.of(age), Dioptres.of(dioptres));
    }
}
