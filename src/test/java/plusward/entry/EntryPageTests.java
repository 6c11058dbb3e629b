package plusward.entry;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import plusward.exam.Field;

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
                        Field.CYCLOPLEGIC_RIGHT,
                        Field.MANIFEST_RIGHT,
                        Field.SEGMENT_RIGHT_MM,
                        Field.ORDERED_RIGHT,
                        Field.NEXT_VISIT_WEEKS);
    }

    @Test
    void aChoiceOffersWhatTheCoreKnowsAndWhateverWasTyped() {
        var agent = new EntryPage.Entry(Field.CYCLOPLEGIC_AGENT, "belladonna", "", null, false);
        assertThat(agent.kind()).isEqualTo("choice");
        assertThat(agent.choices()).containsExactly("cyclopentolate", "atropine", "tropicamide", "other", "belladonna");
    }
}
