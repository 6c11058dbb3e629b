package plusward.entry;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.Field;
import plusward.exam.Reason;
import plusward.readback.FieldRead;

class EntryPageTests {

    @Test
    void everyMeasureOfAVisitHasItsPlaceOnceInTheOrderOfAVisit() {
        var fields = Arrays.stream(EntryPart.values())
                .flatMap(part -> part.rows().stream())
                .flatMap(row -> row.fields().stream())
                .toList();
        assertThat(fields).containsExactlyInAnyOrder(Field.values());
        assertThat(fields).startsWith(Field.VISIT_DATE).endsWith(Field.NOTE);
        assertThat(fields)
                .containsSubsequence(
                        Field.WORN_RIGHT,
                        Field.WORN_LEFT,
                        Field.ACUITY_RIGHT,
                        Field.TURN_CC_NEAR,
                        Field.TURN_CC_UP,
                        Field.DUCTIONS,
                        Field.CYCLOPLEGIC_RIGHT,
                        Field.MANIFEST_RIGHT,
                        Field.CYCLOPLEGIC_MINUTES,
                        Field.SEGMENT_RIGHT_MM,
                        Field.SEGMENT_HEIGHT_RIGHT_MM,
                        Field.PUPIL_HEIGHT_LEFT_MM,
                        Field.ORDERED_RIGHT,
                        Field.NEXT_VISIT_WEEKS);
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, textBlock = """
            typed,     last,      refused, open
            '',        '',        false,   false
            ' ',       '',        false,   false
            normal,    '',        false,   true
            '',        normal,    false,   true
            '',        '',        true,    true
            """)
    void whatIsFoldedStandsOpenOnceItHoldsSomething(String typed, String last, boolean refused, boolean open) {
        Refused why = refused ? Refused.of(Field.DUCTIONS, Reason.of("a"), Reason.of("b")) : null;
        var entry = new EntryPage.Entry(Field.DUCTIONS, typed, last, why, null, read(Field.DUCTIONS));
        var part = new EntryPage.Part("turn", List.of(), List.of(new EntryPage.Row("ductions", null, List.of(entry))));
        assertThat(part.isOpen()).isEqualTo(open);
        assertThat(new EntryPage.Part("turn", List.of(), List.of()).isOpen()).isFalse();
    }

    @Test
    void aChoiceOffersWhatTheCoreKnowsAndWhateverWasTyped() {
        var agent = new EntryPage.Entry(
                Field.CYCLOPLEGIC_AGENT, "belladonna", "", null, null, read(Field.CYCLOPLEGIC_AGENT));
        assertThat(agent.kind()).isEqualTo("choice");
        assertThat(agent.choices()).containsExactly("cyclopentolate", "atropine", "tropicamide", "other", "belladonna");
    }

    private static FieldRead read(Field field) {
        return new FieldRead(field, List.of(), null, List.of());
    }
}
