package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.course.CourseText;

class AcuityLowTests {

    /** 20/50 at 36 to 47 months, 20/40 at 48 to 59: referral criteria, seen; 20/32 from 60: from memory. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            born       | right  | left              | answer  | source
            2022-03-15 | 20/200 | 20/200            | no      | a day under 36 months: no criterion
            2022-03-14 | 20/50  | 20/50             | no      | 36 months
            2022-03-14 | 20/50-1 | 20/50            | look    | a letter worse, right
            2022-03-14 | 20/50  | 20/50-1           | look    | a letter worse, left
            2021-03-15 | 20/50  | 20/50             | no      | a day under 48 months
            2021-03-14 | 20/50  | 20/40             | look    | 48 months
            2021-03-14 | 20/40  | 20/40             | no      | 48 months
            2021-03-14 | 20/40-1 | 20/40            | look    | a letter worse
            2020-03-15 | 20/40  | 20/40             | no      | a day under 60 months
            2020-03-14 | 20/40  | 20/32             | look    | 60 months
            2020-03-14 | 20/32  | 20/32             | no      | 60 months
            2020-03-14 | 20/32-1 | 20/32            | look    | a letter worse
            2020-03-14 | 6/9.6  | 0.20 logMAR       | no      | in metres, and in logMAR
            2020-03-14 | 20/32  | CF                | look    | fingers are low
            2020-03-14 | HM     | 20/32             | look    | hand movements are low
            2020-03-14 | 20/32  | LP                | look    | light is low
            2020-03-14 | 20/32  | NLP               | look    | no light is low
            2020-03-14 | 20/32  | fixes and follows | unknown | it says nothing of how small
            2020-03-14 | 20/32  |                   | unknown | the left is missing
            2020-03-14 |        | 20/32             | unknown | the right is missing
            2020-03-14 |        |                   | unknown | both are missing
            2020-03-14 | 20/200 |                   | look    | one eye is enough
            """)
    void noEyeIsWorseThanTheCriterionOfTheAge(String born, String right, String left, String answer, String source) {
        assertThat(judged(born, "+3.00", right, left)).as(source).answers(answer);
    }

    @Test
    void saysTheEyeAndTheCriterion() {
        assertThat(judged("2020-03-14", "+3.00", "20/20", "20/40"))
                .says("left 20/40: worse than 20/32")
                .hasEvidence("right=20/20, left=20/40, limit=0.20")
                .hasChecks(2);
        assertThat(judged("2020-03-14", "+3.00", "CF", "20/40")).says("right CF, left 20/40: worse than 20/32");
        assertThat(judged("2022-03-14", "+3.00", "20/20", "20/20")).says("20/50");
        assertThat(judged("2024-03-14", "+3.00", "20/20", "20/20")).says("Under 36 months");
        assertThat(judged("2020-03-14", null, "20/200", "20/200")).isNotMet().says("No glasses");
    }

    private static Finding judged(String born, String worn, String right, String left) {
        return Judged.latest(
                new AcuityLow(), CourseText.course(born, """
                        visit_date | worn_right | acuity_right | acuity_left
                        2025-03-14 | %s         | %s           | %s
                        """.formatted(text(worn), text(right), text(left))));
    }

    private static String text(String cell) {
        return cell == null ? "" : cell;
    }
}
