package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.time.LocalDate;
import java.util.Map;
import java.util.Objects;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.PerEye;
import plusward.exam.TurnCondition;
import plusward.optics.Dioptres;
import plusward.optics.Millimetres;
import plusward.optics.PrismDioptres;

class DerivedTests {

    @Test
    void equivalents_latent_hyperopia_and_shortfall_follow_from_the_refractions() {
        Derived derived = Derived.at(CourseText.visit(
                "cycloplegic_right=+3.50 -0.50 x 180",
                "cycloplegic_left=+3.50",
                "manifest_right=+2.00",
                "manifest_left=+2.50 -0.50 x 90",
                "worn_right=+3.00",
                "worn_left=+4.00"));
        assertThat(derived.cycloplegic()).isEqualTo(eyes(3.50 - 0.25, 3.50));
        assertThat(derived.manifest()).isEqualTo(eyes(2.00, 2.50 - 0.25));
        assertThat(derived.worn()).isEqualTo(eyes(3.00, 4.00));
        assertThat(derived.latent()).isEqualTo(eyes(3.25 - 2.00, 3.50 - 2.25));
        assertThat(derived.shortBy()).isEqualTo(eyes(3.25 - 3.00, 3.50 - 4.00));
        assertThat(Objects.requireNonNull(derived.inForce()).takenOn()).isEqualTo(CourseText.DAY);
    }

    @Test
    void what_was_not_measured_stays_missing() {
        Derived derived = Derived.at(CourseText.visit("cycloplegic_right=+3.50", "manifest_left=+2.50"));
        assertThat(derived.latent()).isEqualTo(PerEye.none());
        assertThat(derived.shortBy()).isEqualTo(PerEye.none());
        assertThat(derived.turns()).isEmpty();
        assertThat(derived.turnsTrue()).isEmpty();
        assertThat(Derived.at(CourseText.visit()).inForce()).isNull();
    }

    @Test
    void an_earlier_refraction_is_in_force_but_not_of_this_visit() {
        Derived derived =
                Derived.at(CourseText.course("2019-05-02", """
                visit_date | cycloplegic_right | worn_right | manifest_right
                2024-03-14 | +3.50             |            |
                2025-03-14 |                   | +3.00      | +2.00
                """).latest().orElseThrow());
        assertThat(derived.cycloplegic()).isEqualTo(PerEye.none());
        assertThat(derived.latent()).isEqualTo(PerEye.none());
        assertThat(Objects.requireNonNull(derived.inForce()).takenOn()).isEqualTo(LocalDate.parse("2024-03-14"));
        assertThat(derived.shortBy()).isEqualTo(new PerEye<>(Dioptres.of(0.5), null));
    }

    @Test
    void turns_are_signed_and_a_vertical_one_alone_is_none() {
        Derived derived = Derived.at(CourseText.visit(
                "turn_sc_distance=ET 25",
                "turn_cc_distance=X(T) 4",
                "turn_cc_near=ortho",
                "turn_add_near=RHT 4",
                "turn_sc_near=ET 30+25"));
        assertThat(derived.turns())
                .isEqualTo(Map.of(
                        TurnCondition.SC_DISTANCE, PrismDioptres.of(25),
                        TurnCondition.CC_DISTANCE, PrismDioptres.of(-4),
                        TurnCondition.CC_NEAR, PrismDioptres.ZERO,
                        TurnCondition.SC_NEAR, PrismDioptres.of(30).withPrismBeforeOtherEye(PrismDioptres.of(25))));
    }

    /** Scattergood, Brown, Guyton 1983 for the direction; 2.5 % for each dioptre from memory. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            right             | left  | read  | true (Δ) | source
            +5.00             | +5.00 | ET 30 | 34.2857  | 30/(1 − 0.025 · 5)
            +4.00             | +6.00 | ET 30 | 34.2857  | the mean of both lenses
            +5.00 -2.00 x 90  | +5.00 -2.00 x 90 | ET 30 | 32.4324 | along the horizontal +3.00: 30/0.925
            +5.00 -2.00 x 180 | +5.00 -2.00 x 180 | ET 30 | 34.2857 | the cylinder lies along the vertical
            -5.00             | -5.00 | XT 30 | -26.6667 | −30/(1 + 0.125)
            +5.00             |       | ET 30 |          | a lens is missing
                              | +5.00 | ET 30 |          | a lens is missing
            +5.00             | +5.00 |       |          | no reading
            +21.00            | +21.00 | ET 30 |         | beyond ±20 D
            """)
    void a_distance_turn_read_through_glasses_has_its_true_size_beside_it(
            String right, String left, String read, Double turn, String source) {
        Derived derived = Derived.at(CourseText.visit(
                "worn_right=" + text(right),
                "worn_left=" + text(left),
                "turn_cc_distance=" + text(read),
                "turn_cc_near=ET 30"));
        assertThat(derived.turnsTrue().keySet()).as(source).hasSize(turn == null ? 0 : 1);
        if (turn != null) {
            assertThat(Objects.requireNonNull(derived.turnsTrue().get(TurnCondition.CC_DISTANCE))
                            .amount())
                    .as(source)
                    .isCloseTo(turn, within(1e-4));
        }
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            pupil (mm) | top (mm) | below edge (mm) | used (mm) | assumed | source
            4          | -3.5     | 1.5             | 4         | false   | edge at −2.0, the line 1.5 below
            4          | -3.0     | 1.0             | 4         | false   | edge at −2.0
            4          | -2.0     | 0               | 4         | false   | at the edge
            4          | 0        | -2.0            | 4         | false   | bisecting the pupil
                       | -3.5     | 1.25            | 4.5       | true    | room light, 4.5 mm, from memory
            """)
    void the_segment_lies_so_far_below_the_pupils_lower_edge(
            String pupil, String top, double below, double used, boolean assumed, String source) {
        SegmentPlace place = SegmentPlace.at(
                        CourseText.visit(
                                "worn_add=2.50",
                                "segment_right_mm=" + top,
                                "segment_left_mm=-4",
                                "pupil_mm=" + text(pupil)),
                        Limits.DEFAULT)
                .orElseThrow();
        assertThat(place.belowEdge().right()).as(source).isEqualTo(Millimetres.of(below));
        assertThat(place.belowEdge().left()).as(source).isEqualTo(Millimetres.of(4 - used / 2));
        assertThat(place.top().left()).isEqualTo(Millimetres.of(-4));
        assertThat(place.pupil()).as(source).isEqualTo(Millimetres.of(used));
        assertThat(place.assumed()).as(source).isEqualTo(assumed);
    }

    @Test
    void a_segment_is_placed_only_where_there_is_a_line() {
        assertThat(place("worn_add=", "segment_right_mm=-3")).isFalse();
        assertThat(place("worn_add=2.50", "segment_style=flat-top 28")).isFalse();
        assertThat(place("worn_add=2.50", "segment_right_mm=-3", "segment_style=progressive"))
                .isFalse();
        assertThat(place("worn_add=2.50", "segment_right_mm=-3", "segment_style=executive"))
                .isTrue();
        assertThat(place("worn_add=2.50", "segment_left_mm=-3")).isTrue();
    }

    private static boolean place(String... entries) {
        return SegmentPlace.at(CourseText.visit(entries), Limits.DEFAULT).isPresent();
    }

    private static PerEye<Dioptres> eyes(double right, double left) {
        return new PerEye<>(Dioptres.of(right), Dioptres.of(left));
    }

    private static String text(String cell) {
        return Objects.requireNonNullElse(cell, "");
    }
}
