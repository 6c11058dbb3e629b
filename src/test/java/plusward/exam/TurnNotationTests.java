package plusward.exam;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TurnNotationTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', quoteCharacter = '"', textBlock = """
            typed              | turn          | source
            ET 25              | ET 25         | interchange format: manifest
            E(T) 14            | E(T) 14       | interchange format: intermittent
            E 6                | E 6           | interchange format: latent
            XT 10              | XT 10         | interchange format
            X(T) 8             | X(T) 8        | interchange format
            X 4                | X 4           | interchange format
            ortho              | ortho         | interchange format
            ET 25 RHT 4        | ET 25 RHT 4   | interchange format
            LHT 6              | LHT 6         | interchange format
            RH 3               | RH 3          | interchange format
            ET30               | ET 30         | interchange format
            25 ET              | ET 25         | interchange format
            25Δ ET             | ET 25         | interchange format
            25 pd ET           | ET 25         | interchange format, at distance without the prime
            ET 30+25           | ET 30+25      | interchange format: split prisms
            ET 30 + 25         | ET 30+25      | spaces around the plus
            30+25 ET           | ET 30+25      | size first
            25∆ ET             | ET 25         | the increment sign
            ET 25 Δ            | ET 25         | the unit apart
            et 25 rh(t) 4      | ET 25 RH(T) 4 | any case
            RHT 4 ET 25        | ET 25 RHT 4   | vertical first
            4 RHT 25 ET        | ET 25 RHT 4   | sizes first
            ET 25, RHT 4       | ET 25 RHT 4   | a comma between
            ET 25,RHT 4        | ET 25 RHT 4   | a comma without a space
            ortho LHT 6        | ortho LHT 6   | both stated
            ET 0               | ortho         | no prism is ortho, latent by convention
            X 0.0              | ortho         | no prism is ortho
            E 2.5              | E 2.5         | to 0.1 Δ
            ET 149.9           | ET 149.9      | just below the largest
            ET 150             | ET 150        | the largest
            RHT 150            | RHT 150       | the largest
            ET 0+5             | ET 0+5        | kept as typed
            """)
    void readsAtDistanceAndNear(String typed, String turn, String source) {
        assertThat(Turn.parse(typed, Viewing.DISTANCE)).as(source).hasToString(turn);
        assertThat(Turn.parse(typed, Viewing.NEAR)).as(source).hasToString(turn);
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', quoteCharacter = '"', textBlock = """
            typed       | turn        | source
            25 pd ET'   | ET 25       | interchange format
            ET' 25      | ET 25       | the prime behind the direction
            ET′ 25      | ET 25       | the prime character
            ET’ 25      | ET 25       | the typographic apostrophe
            ET 25'      | ET 25       | the prime behind the size
            E(T)' 14    | E(T) 14     | intermittent
            ortho'      | ortho       | ortho at near
            E' 6 RHT' 4 | E 6 RHT 4   | both parts
            """)
    void thePrimeIsANearReadingAndIsRefusedAtDistance(String typed, String turn, String source) {
        assertThat(Turn.parse(typed, Viewing.NEAR)).as(source).hasToString(turn);
        Refused.assertThat(() -> Turn.parse(typed, Viewing.DISTANCE)).as(source).saying("turn", "prime", typed);
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', quoteCharacter = '"', textBlock = """
            typed            | problem    | source
            25               | direction  | a size alone
            25Δ              | direction  | a size with its unit alone
            30+25            | direction  | two sizes alone
            ET 25 4          | direction  | a second size alone
            ET               | size       | a direction alone
            E(T)             | size       | a direction alone
            ET 25 RHT        | size       | the vertical size is lacking
            ET 25 XT 10      | twice      | two horizontal turns
            ortho ET 25      | twice      | two horizontal turns
            ET 25 ortho      | twice      | two horizontal turns
            RHT 4 LHT 4      | twice      | two vertical turns
            ET 150.1         | range      | just above the largest
            RHT 151          | range      | just above the largest
            ET 1000          | range      | four digits
            ET 100+100       | range      | together a right angle
            ET 67+68         | range      | together 248 Δ
            ET 150+150       | range      | beyond a right angle
            ET 25+151        | range      | the other prism alone
            ET 25.55         | fine       | finer than 0.1 Δ
            ET 30+25.55      | fine       | finer than 0.1 Δ
            ET 25,5          | comma      | decimal comma
            -25              | unreadable | a sign is not a direction
            ET -25           | unreadable | the direction is the sign
            ET +25           | unreadable | the direction is the sign
            eso 25           | unreadable | not written in full
            ET 25 RHT4x      | unreadable | something behind
            ET 25RHT 4       | unreadable | nothing between the parts
            ET 25,           | unreadable | nothing behind the comma
            ET 30+           | unreadable | nothing behind the plus
            HT 4             | unreadable | which eye?
            RXT 4            | unreadable | not a vertical turn
            E T 25           | unreadable | apart
            ET 25°           | unreadable | degrees are not prism dioptres
            , ET 25          | unreadable | comma first
            ET ٢٥            | unreadable | digits of another script
            """)
    void refuses(String typed, String problem, String source) {
        Refused.assertThat(() -> Turn.parse(typed, Viewing.NEAR)).as(source).saying("turn", problem, typed);
    }

    @Test
    void refusesNothingAndTooMuch() {
        Refused.assertThat(() -> Turn.parse("", Viewing.NEAR)).saying("turn", "unreadable", "");
        Refused.assertThat(() -> Turn.parse("ET " + "1".repeat(58), Viewing.NEAR))
                .saying("turn", "long");
        Refused.assertThat(() -> Turn.parse("ET " + "1".repeat(57), Viewing.NEAR))
                .saying("turn", "range");
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            typed    | signed Δ | source
            ET 25    | 25       | eso +
            E(T) 14  | 14       | eso +
            E 6      | 6        | eso +
            XT 10    | -10      | exo −
            X(T) 8   | -8       | exo −
            ortho    | 0        | straight
            ET 30+25 | 59.46    | 55/(1 − 750/10⁴)
            XT 20+20 | -41.67   | 40/(1 − 400/10⁴)
            """)
    void signedIsInwardPositive(String typed, double signed, String source) {
        assertThat(Turn.parse(typed, Viewing.DISTANCE).signed().inPrismDioptres())
                .as(source)
                .isEqualTo(signed, within(0.005));
    }

    @Test
    void aVerticalTurnAloneSaysNothingOfTheHorizontalOne() {
        Turn turn = Turn.parse("LHT 6", Viewing.DISTANCE);
        assertThat(turn.signed()).isNull();
        assertThat(turn.horizontal()).isNull();
        assertThat(turn.vertical()).isEqualTo(new VerticalTurn(Eye.LEFT, Phase.MANIFEST, PrismReading.of(6)));
    }
}
