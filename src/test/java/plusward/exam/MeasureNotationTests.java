package plusward.exam;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.Map;
import java.util.function.Function;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class MeasureNotationTests {

    /** Every number a visit holds, by its notation. */
    private static final Map<String, Function<String, Object>> NUMBERS = Map.of(
            "add", MeasureNotation::add,
            "hours", MeasureNotation::hours,
            "segment", MeasureNotation::height,
            "lens-height", MeasureNotation::lensHeight,
            "pupil", MeasureNotation::pupil,
            "pupil-distance", MeasureNotation::pupilDistance,
            "weeks", MeasureNotation::weeks,
            "drops", MeasureNotation::drops,
            "minutes", MeasureNotation::minutes,
            "stereo", Stereo::parse);

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            notation       | typed  | printed | source
            add            | 0      | 0.00    | lowest
            add            | 2.5    | +2.50   | a sign is not needed
            add            | +2.50  | +2.50   | a plus is welcome
            add            | .75    | +0.75   | no zero before the point
            add            | 4.00   | +4.00   | highest
            hours          | 0      | 0       | lowest
            hours          | 7.5    | 7.5     | half an hour
            hours          | 7.25   | 7.25    | a quarter
            hours          | 8      | 8       | whole
            hours          | 10.50  | 10.5    | no needless zero
            hours          | 24     | 24      | highest
            segment        | -20    | -20.0   | lowest
            segment        | -3.5   | -3.5    | below the pupil centre
            segment        | −3.5   | -3.5    | the minus sign
            segment        | +.5    | +0.5    | above it
            segment        | .5     | +0.5    | a spreadsheet dropped the plus
            segment        | 3.5    | +3.5    | a spreadsheet dropped the plus
            segment        | -3.25  | -3.25   | two decimals
            segment        | 0      | 0.0     | 0 needs no sign
            segment        | +20    | +20.0   | highest
            lens-height    | 0      | 0.0     | lowest
            lens-height    | 18.5   | +18.5   | half a millimetre
            lens-height    | 18.25  | +18.25  | two decimals
            lens-height    | 60     | +60.0   | highest
            drops          | 1      | 1       | fewest
            drops          | 10     | 10      | most
            minutes        | 1      | 1       | shortest
            minutes        | 1440   | 1440    | a day
            pupil          | 1      | +1.0    | lowest
            pupil          | 4.5    | +4.5    | half a millimetre
            pupil          | 10     | +10.0   | highest
            pupil-distance | 30     | +30.0   | lowest
            pupil-distance | 47.5   | +47.5   | half a millimetre
            pupil-distance | 80     | +80.0   | highest
            weeks          | 0      | 0       | lowest
            weeks          | 26     | 26      | half a year
            weeks          | 260    | 260     | highest
            stereo         | nil    | nil     | none found
            stereo         | NIL    | nil     | any case
            stereo         | 1      | 1       | finest
            stereo         | 40     | 40      | whole seconds of arc
            stereo         | 10000  | 10000   | coarsest
            """)
    void readsNumbersWithinTheirRange(String notation, String typed, String printed, String source) {
        assertThat(NUMBERS.get(notation).apply(typed)).as(source).hasToString(printed);
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            notation       | typed  | problem    | source
            add            | -0.01  | range      | just below
            add            | 4.01   | range      | just above
            add            | 2.505  | fine       | finer than 0.01 D
            add            | 2,5    | comma      | decimal comma
            add            | two    | unreadable | a word
            hours          | -0.01  | range      | just below
            hours          | 24.01  | range      | just above
            hours          | 7.125  | fine       | finer than 0.01 h
            hours          | 7,5    | comma      | decimal comma
            hours          | 8h     | unreadable | with its unit
            segment        | -20.01 | range      | just below
            segment        | +20.01 | range      | just above
            segment        | -3.125 | fine       | finer than 0.01 mm
            segment        | -3,5   | comma      | decimal comma
            segment        | low    | unreadable | a word
            lens-height    | -0.01  | range      | just below
            lens-height    | 60.01  | range      | just above
            lens-height    | 18.125 | fine       | finer than 0.01 mm
            lens-height    | 18,5   | comma      | decimal comma
            lens-height    | high   | unreadable | a word
            drops          | 0      | range      | just below
            drops          | 11     | range      | just above
            drops          | 2x     | unreadable | a letter
            minutes        | 0      | range      | just below
            minutes        | 1441   | range      | just above
            minutes        | 40 min | unreadable | with its unit
            pupil          | 0.99   | range      | just below
            pupil          | 10.01  | range      | just above
            pupil          | 4.125  | fine       | finer than 0.01 mm
            pupil          | 4,5    | comma      | decimal comma
            pupil          | 4.     | unreadable | nothing behind the point
            pupil-distance | 29.99  | range      | just below
            pupil-distance | 80.01  | range      | just above
            pupil-distance | 47.125 | fine       | finer than 0.01 mm
            pupil-distance | 47,5   | comma      | decimal comma
            pupil-distance | 24/24  | unreadable | half distances
            weeks          | 261    | range      | just above
            weeks          | -1     | unreadable | a sign
            weeks          | 2.5    | unreadable | not whole
            stereo         | 0      | range      | just below
            stereo         | 10001  | range      | just above
            stereo         | 40"    | unreadable | with its unit
            stereo         | none   | unreadable | not the word
            """)
    void refusesNumbersOutsideTheirRange(String notation, String typed, String problem, String source) {
        Refused.assertThat(() -> NUMBERS.get(notation).apply(typed)).as(source).saying(notation, problem, typed);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "add",
                "hours",
                "segment",
                "pupil",
                "pupil-distance",
                "weeks",
                "stereo",
                "lens-height",
                "drops",
                "minutes"
            })
    void refusesHugeNumbersAndLongOnes(String notation) {
        Refused.assertThat(() -> NUMBERS.get(notation).apply("9".repeat(60))).saying(notation, "range");
        Refused.assertThat(() -> NUMBERS.get(notation).apply("9".repeat(61))).saying(notation, "long");
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            typed        | source
            1900-01-01   | first
            2024-02-29   | leap day
            2026-03-14   | interchange format
            2199-12-31   | last
            """)
    void readsIsoDates(String typed, String source) {
        assertThat(MeasureNotation.date(typed)).as(source).isEqualTo(LocalDate.parse(typed));
        assertThat(MeasureNotation.requiredDate(" " + typed + " ")).as(source).isEqualTo(LocalDate.parse(typed));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            typed        | problem    | source
            1899-12-31   | range      | just before the first
            2200-01-01   | range      | just after the last
            2026-02-30   | calendar   | February has no 30th
            2025-02-29   | calendar   | no leap year
            2026-13-01   | calendar   | no such month
            14/03/2026   | unreadable | day or month first?
            2026-3-14    | unreadable | two digits each
            20260314     | unreadable | no hyphens
            +2026-03-14  | unreadable | a sign
            today        | unreadable | a word
            """)
    void refusesOtherDates(String typed, String problem, String source) {
        Refused.assertThat(() -> MeasureNotation.date(typed)).as(source).saying("date", problem, typed);
    }

    @Test
    void aRequiredDateMustBeThereAndNoLongerThanADate() {
        Refused.assertThat(() -> MeasureNotation.requiredDate(" \u00a0")).saying("date", "missing");
        Refused.assertThat(() -> MeasureNotation.date("2026-03-14" + "0".repeat(51)))
                .saying("date", "long");
    }

    @Test
    void aLineIsKeptAsTypedUpToItsLength() {
        assertThat(MeasureNotation.line("  Ana, O’Hara; = + م  ")).isEqualTo("Ana, O’Hara; = + م");
        assertThat(MeasureNotation.line("a".repeat(80))).hasSize(80);
        Refused.assertThat(() -> MeasureNotation.line("a".repeat(81))).saying("line", "long");
    }

    @Test
    void aNoteIsKeptAsTypedUpToItsLength() {
        assertThat(MeasureNotation.note("a\r\nb\rc\td\n")).isEqualTo("a\nb\nc\td");
        assertThat(MeasureNotation.note("a".repeat(4000))).hasSize(4000);
        Refused.assertThat(() -> MeasureNotation.note("a".repeat(4001))).saying("note", "long");
    }

    @ParameterizedTest
    @ValueSource(strings = {"a\u0000b", "a\u001bb", "a\u007fb", "a\u0085b", "a\ud800b", "a\udc00b"})
    void whatCannotBeStoredIsRefusedInAnyText(String text) {
        Refused.assertThat(() -> MeasureNotation.line(text)).saying("line", "control", text);
        Refused.assertThat(() -> MeasureNotation.note(text)).saying("note", "control", text);
    }

    @ParameterizedTest
    @ValueSource(strings = {"a\nb", "a\tb"})
    void linesAndTabsBelongToNotesOnly(String text) {
        Refused.assertThat(() -> MeasureNotation.line(text)).saying("line", "control", text);
        assertThat(MeasureNotation.note(text)).isEqualTo(text);
    }
}
