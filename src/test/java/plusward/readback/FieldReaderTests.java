package plusward.readback;

import static org.assertj.core.api.Assertions.assertThat;

import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import plusward.exam.Field;

class FieldReaderTests {

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            visit_date | read back                           | source
            2019-05-01 | before the day of birth, 2019-05-02 | born on 2019-05-02
            2019-05-02 | less than 1 month old               | the day of birth
            2019-06-01 | less than 1 month old               | the day before
            2019-06-02 | 1 month old                         | one calendar month
            2020-05-01 | 11 months old                       | the day before the first birthday
            2020-05-02 | 1 year old                          | the first birthday
            2020-06-02 | 1 year 1 month old                  | and a month
            2025-05-01 | 5 years 11 months old               | the day before the sixth birthday
            2025-05-02 | 6 years old                         | the sixth birthday
            """)
    void theDateIsReadBackAsTheAge(String date, String readBack, String source) {
        assertThat(Reread.words(
                        Reread.of("visit_date=" + date).at(Field.VISIT_DATE).understood()))
                .as(source)
                .isEqualTo(readBack);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, nullValues = "-", textBlock = """
            column               | typed          | read back                  | source, the visit is on 2025-03-14
            worn_since           | 2025-03-15     | after this visit           | a day later
            worn_since           | 2025-03-14     | this week                  | the same day
            worn_since           | 2025-03-08     | this week                  | 6 days before
            worn_since           | 2025-03-07     | 1 week before this visit   | 7 days
            worn_since           | 2025-02-28     | 2 weeks before this visit  | 14 days
            worn_since           | 2024-03-14     | 52 weeks before this visit | 365 days are 52 weeks and a day
            next_visit_weeks     | 0              | around 2025-03-14          | the same day
            next_visit_weeks     | 4              | around 2025-04-11          | 28 days later
            wear_hours           | 12.50          | -                          | only a zero differs
            wear_hours           | +12.5          | -                          | a plus sign says nothing new
            worn_add             | 2.5            | -                          | only a sign and a zero differ
            cycloplegic_agent    | Cyclopentolate | -                          | only the case differs
            stereo_arcsec        | NIL            | -                          | only the case differs
            pupil_height_left_mm | 20             | -                          | without the segment's height there is no offset
            """)
    void theOtherFieldsAreReadBack(String column, String typed, @Nullable String readBack, String source) {
        Field field = Field.named(column).orElseThrow();
        assertThat(Reread.words(Reread.of(column + "=" + typed).at(field).understood()))
                .as(source)
                .isEqualTo(readBack == null ? "" : readBack);
    }

    /** The lower edge of a pupil of 4 mm lies 2.0 mm below its centre; of the usual one of 4.5 mm 2.25 mm. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, nullValues = "-", textBlock = """
            add, D | pupil, mm | top, mm | read back                              | source
            2.50   | 4         | -3.5    | 1.5 mm below the pupil’s lower edge    | -2.0 - (-3.5)
            2.50   | 4         | -2.0    | at the pupil’s lower edge              | -2.0 - (-2.0)
            2.50   | 4         | -1.9    | 0.1 mm above the pupil’s lower edge    | -2.0 - (-1.9)
            2.50   | 4         | -2.1    | 0.1 mm below the pupil’s lower edge    | -2.0 - (-2.1)
            2.50   | 4         | +1.0    | 3.0 mm above the pupil’s lower edge    | -2.0 - 1.0
            2.50   | ''        | -2.25   | at the pupil’s lower edge              | the usual pupil is assumed
            ''     | 4         | -3.5    | -                                      | no add is worn
            0      | 4         | -3.5    | -                                      | an add of 0 is none
            """)
    void theSegmentIsReadBackAgainstThePupilsLowerEdge(
            String add, String pupil, String top, @Nullable String readBack, String source) {
        for (Field field : new Field[] {Field.SEGMENT_RIGHT_MM, Field.SEGMENT_LEFT_MM}) {
            ReadBack read = Reread.of("worn_add=" + add, "pupil_mm=" + pupil, field.column() + "=" + top);
            assertThat(Reread.words(read.at(field).understood()))
                    .as(source)
                    .isEqualTo(readBack == null ? "" : readBack);
        }
    }

    @Test
    void twoHeightsOverTheLensAreReadBackAsTheirDifference() {
        ReadBack read = Reread.of("segment_height_left_mm=18.5", "pupil_height_left_mm=20");
        assertThat(Reread.words(read.at(Field.PUPIL_HEIGHT_LEFT_MM).understood()))
                .isEqualTo("segment top −1.5 mm from the pupil centre");
        assertThat(read.at(Field.SEGMENT_HEIGHT_LEFT_MM).understood()).isEmpty();
        assertThat(read.at(Field.PUPIL_HEIGHT_RIGHT_MM).understood()).isEmpty();
    }

    @ParameterizedTest
    @EnumSource
    void nothingIsReadWhereNothingIsTyped(Field field) {
        ReadBack read = Reread.of(field.column() + "= ");
        assertThat(read.at(field).understood()).isEmpty();
        assertThat(read.at(field).doubts()).isEmpty();
    }
}
