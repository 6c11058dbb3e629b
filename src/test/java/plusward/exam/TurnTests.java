package plusward.exam;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.HorizontalTurn.Direction;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;

class TurnTests {

    @Test
    void needsAHorizontalOrAVerticalPart() {
        assertThatIllegalArgumentException().isThrownBy(() -> new Turn(null, null));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            turn         | mirrored     | source
            ET 25        | ET 25        | inward stays inward
            ET 25 RHT 4  | ET 25 LHT 4  | the other eye is the higher one
            LH(T) 6      | RH(T) 6      | the other eye is the higher one
            """)
    void mirrored(String turn, String mirrored, String source) {
        assertThat(turn(turn).mirrored()).as(source).isEqualTo(turn(mirrored));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            turn    | shows | ortho | source
            ET 25   | true  | false | manifest
            E(T) 25 | true  | false | intermittent shows some of the time
            E 25    | false | false | latent
            ortho   | false | true  | straight
            """)
    void showsWhenManifestOrIntermittent(String turn, boolean shows, boolean ortho, String source) {
        assertThat(turn(turn).horizontal().phase().shows()).as(source).isEqualTo(shows);
        assertThat(turn(turn).horizontal().isOrtho()).as(source).isEqualTo(ortho);
    }

    @Test
    void noPrismIsOrthoWhateverWasWritten() {
        HorizontalTurn none = new HorizontalTurn(Direction.OUTWARD, Phase.MANIFEST, PrismReading.of(0));
        assertThat(none).isEqualTo(HorizontalTurn.ORTHO).hasToString("ortho");
        assertThat(none.signed()).isEqualTo(PrismDioptres.ZERO);
    }

    @Test
    void aConditionThatIsNotThereWasNotMeasured() {
        Turns turns = new Turns(
                Map.of(TurnCondition.CC_NEAR, turn("X 8"), TurnCondition.SC_DISTANCE, turn("LHT 6")), Dioptres.of(3));
        assertThat(turns.at(TurnCondition.CC_NEAR)).isEqualTo(turn("X 8"));
        assertThat(turns.signedAt(TurnCondition.CC_NEAR)).isEqualTo(PrismDioptres.of(-8));
        assertThat(turns.horizontalAt(TurnCondition.CC_NEAR))
                .isEqualTo(turn("X 8").horizontal());
        assertThat(turns.signedAt(TurnCondition.SC_DISTANCE)).isNull();
        assertThat(turns.horizontalAt(TurnCondition.SC_DISTANCE)).isNull();
        assertThat(turns.at(TurnCondition.CC_DISTANCE)).isNull();
        assertThat(turns.signedAt(TurnCondition.CC_DISTANCE)).isNull();
        assertThat(turns.horizontalAt(TurnCondition.CC_DISTANCE)).isNull();
        assertThat(turns.mirrored().trialPlus()).isEqualTo(Dioptres.of(3));
    }

    @Test
    void turnsComeInTheOrderOfTheirConditionsAndDoNotChange() {
        Map<TurnCondition, Turn> measured =
                Map.of(TurnCondition.TRIAL_NEAR, turn("E 2"), TurnCondition.SC_DISTANCE, turn("ET 30"));
        Turns turns = new Turns(measured, null);
        assertThat(turns.byCondition().keySet()).containsExactly(TurnCondition.SC_DISTANCE, TurnCondition.TRIAL_NEAR);
        assertThatThrownBy(() -> turns.byCondition().clear()).isInstanceOf(UnsupportedOperationException.class);
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            condition   | viewing  | corrected | source
            SC_DISTANCE | DISTANCE | false     | without correction
            SC_NEAR     | NEAR     | false     | without correction
            CC_DISTANCE | DISTANCE | true      | with the glasses
            CC_NEAR     | NEAR     | true      | with the glasses
            ADD_NEAR    | NEAR     | true      | through the segment
            TRIAL_NEAR  | NEAR     | true      | trial plus over the glasses
            """)
    void everyConditionHasItsDistanceAndItsLenses(
            TurnCondition condition, Viewing viewing, boolean corrected, String source) {
        assertThat(condition.viewing()).as(source).isEqualTo(viewing);
        assertThat(condition.isCorrected()).as(source).isEqualTo(corrected);
    }

    private static Turn turn(String typed) {
        return Turn.parse(typed, Viewing.DISTANCE);
    }
}
