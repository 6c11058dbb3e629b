package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.Reason;
import plusward.optics.Age;
import plusward.optics.Millimetres;
import plusward.optics.PrismDioptres;
import plusward.optics.PrismPerDioptre;

class HeterophoriaAcaTests {

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            PD (mm) | distance (Δ) | near (Δ) | ratio (Δ/D) | source
            50      | 5            | 20       | 10          | 5.0 + (20 - 5)/3, definition
            60      | -2           | -8       | 4           | 6.0 + (-8 + 2)/3, definition
            54      | 6            | 6        | 5.4         | equal turns leave the pupil distance in cm
            """)
    void it_is_the_pupil_distance_and_a_third_of_near_minus_distance(
            double pd, double distance, double near, double ratio, String source) {
        var estimate = HeterophoriaAca.estimate(Millimetres.of(pd), PrismDioptres.of(distance), PrismDioptres.of(near));
        assertThat(estimate.value()).as(source).isEqualTo(PrismPerDioptre.of(ratio));
    }

    /** Limits of one reading over 20 Δ: distance 7.3 Δ, near 8.3 Δ; to 20 Δ 4.1 and 3.3 Δ (PEDIG 2009). */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            distance (Δ) | near (Δ) | limit distance | limit near | source
            5            | 20       | 4.1            | 3.3        | PEDIG 2009
            22           | 40       | 7.3            | 8.3        | PEDIG 2009
            4            | 24       | 4.1            | 8.3        | PEDIG 2009
            """)
    void its_interval_comes_from_both_readings(
            double distance, double near, double limitDistance, double limitNear, String source) {
        var estimate = HeterophoriaAca.estimate(Millimetres.of(50), PrismDioptres.of(distance), PrismDioptres.of(near));
        double half = Math.sqrt(limitDistance * limitDistance + limitNear * limitNear) / 3;
        double ratio = 5 + (near - distance) / 3;
        assertThat(estimate.low().amount()).as(source).isCloseTo(ratio - half, within(1e-8));
        assertThat(estimate.high().amount()).as(source).isCloseTo(ratio + half, within(1e-8));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            age (y) | PD (mm) | source
            0.5     | 46.5    | youngest studied stands in
            1       | 46.5    | thesis, Pacific University 1993, n = 220
            2       | 47.5    | the same
            2.5     | 48.5    | halfway from 47.5 to 49.5
            3       | 49.5    | thesis, Pacific University 1993
            4       | 51.0    | the same
            4.5     | 51.0    | the same, 4 to 5 years
            5       | 51.0    | the same
            6       | 52      | from memory
            7       | 53      | halfway from 52 to 54
            8       | 54      | from memory
            10      | 56      | from memory
            12      | 58      | from memory
            15      | 60      | from memory
            18      | 60      | oldest known stands in
            """)
    void where_it_was_not_measured_the_usual_pupil_distance_for_the_age_stands_in(
            double age, double pd, String source) {
        assertThat(PupilDistance.usualAt(Age.of(age))).as(source).isEqualTo(Millimetres.of(pd));
    }

    @Test
    void an_assumed_pupil_distance_is_labelled() {
        Visit visit = CourseText.visit("turn_cc_distance=E 5", "turn_cc_near=E 20");
        Millimetres usual = PupilDistance.usualAt(visit.age());
        AcaEstimate aca = HeterophoriaAca.at(visit).orElseThrow();
        assertThat(aca.from().values().get(0)).isEqualTo(Reason.of("aca.pd-assumed", usual.unsigned()));
        assertThat(aca.ratio().value()).isEqualTo(PrismPerDioptre.of(usual.inCentimetres() + 5));
    }

    @Test
    void a_measured_pupil_distance_is_used_and_said() {
        Visit visit = CourseText.visit("turn_cc_distance=E 5", "turn_cc_near=E 20", "pd_mm=50");
        AcaEstimate aca = HeterophoriaAca.at(visit).orElseThrow();
        assertThat(aca.from().values().get(0)).isEqualTo(Reason.of("aca.pd-measured", "50.0"));
        assertThat(aca.ratio().value()).isEqualTo(PrismPerDioptre.of(10));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn_right | worn_left | cycloplegic_left | label            | source
            +3.00      | +3.00     | +3.50            | aca.full-plus    | 0.50 D short is still full
            +3.00      | +3.00     | +3.51            | aca.plus-short   | over 0.50 D short in one eye
            +3.00      |           | +3.50            | aca.plus-unknown | a lens is missing
            """)
    void plus_that_is_not_full_is_labelled(
            String right, String left, String cycloplegicLeft, String label, String source) {
        Visit visit = CourseText.visit(
                "worn_right=" + right,
                "worn_left=" + (left == null ? "" : left),
                "cycloplegic_right=+3.00",
                "cycloplegic_left=" + cycloplegicLeft,
                "turn_cc_distance=E 5",
                "turn_cc_near=E 20");
        Reason from = HeterophoriaAca.at(visit).orElseThrow().from();
        assertThat(from.key()).isEqualTo("aca.heterophoria");
        assertThat(from.values().get(1)).as(source).isEqualTo(Reason.of(label));
    }

    @Test
    void with_one_of_the_readings_missing_there_is_none() {
        assertThat(HeterophoriaAca.at(CourseText.visit("turn_cc_distance=E 5"))).isEmpty();
        assertThat(HeterophoriaAca.at(CourseText.visit("turn_cc_near=E 20"))).isEmpty();
    }
}
