package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.course.PublishedCourse.Point;
import plusward.optics.Age;
import plusward.optics.Dioptres;

/** +0.12 D/y from 3 to 7 under +4.00, else 0; then −0.17 (Bonafede 2020) to −0.24 D/y (Black 2006) until 15. */
class PublishedCourseTests {

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            first (y) | H (D) | until (y) | band                                  | source
            5         | 3.00  | 10        | 5: 3.0 3.0; 7: 3.24 3.24; 10: 2.52 2.73 | 3 + 2 · 0.12; 3.24 − 3 · 0.24 and − 3 · 0.17
            5         | 3.99  | 7         | 5: 3.99 3.99; 7: 4.23 4.23            | under +4.00 at its beginning
            5         | 4.00  | 10        | 5: 4.0 4.0; 7: 4.0 4.0; 10: 3.28 3.49 | from +4.00 level until 7
            3         | 4.00  | 5         | 3: 4.0 4.0; 5: 4.0 4.0                | ends before 7
            2         | 3.00  | 4         | 3: 3.0 3.0; 4: 3.12 3.12              | begins at 3
            7         | 3.00  | 8         | 7: 3.0 3.0; 8: 2.76 2.83              | begins at 7
            8         | 3.00  | 10        | 8: 3.0 3.0; 10: 2.52 2.66             | begins after 7
            14        | 3.00  | 18        | 14: 3.0 3.0; 15: 2.76 2.83            | ends at 15
            15        | 3.00  | 18        |                                       | none after 15
            1         | 3.00  | 3         |                                       | none before 3
            5         | 3.00  | 5         |                                       | no time between
            """)
    void the_band_follows_the_published_series(
            double first, double hyperopia, double until, String band, String source) {
        List<Point> points = PublishedCourse.from(Age.of(first), Dioptres.of(hyperopia), Age.of(until));
        assertThat(String.join(
                        "; ", points.stream().map(PublishedCourseTests::written).toList()))
                .as(source)
                .isEqualTo(band == null ? "" : band);
    }

    private static String written(Point point) {
        return "%.0f: %s %s"
                .formatted(
                        point.age().inYears(),
                        point.low().amount(),
                        point.high().amount());
    }
}
