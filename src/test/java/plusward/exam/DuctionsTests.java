package plusward.exam;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DuctionsTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            typed                               | canonical                       | source
            normal                              | normal                          | nothing is limited
            NORMAL                              | normal                          | any case
            right abduction                     | right abduction                 | one movement
            R abduction                         | right abduction                 | a letter for the eye
            od Abduction                        | right abduction                 | the eye in Latin
            OS depression                       | left depression                 | the eye in Latin
            l  adduction                        | left adduction                  | two spaces
            left elevation, right abduction     | right abduction, left elevation | the right eye first
            left elevation;right abduction      | right abduction, left elevation | a semicolon
            right elevation, right abduction    | right abduction, right elevation | in the order of the movements
            left abduction, OS abduction        | left abduction                  | the same twice counts once
            """)
    void readsWhatIsLimited(String typed, String canonical, String source) {
        assertThat(Ductions.parse(typed)).as(source).hasToString(canonical);
        assertThat(Ductions.parse(canonical)).as(source).isEqualTo(Ductions.parse(typed));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            typed                    | source
            abduction                | which eye?
            right                    | which movement?
            both abduction           | an eye each
            right abduction -2       | how much is not recorded
            right abduction,         | what follows the comma?
            , right abduction        | what stands before the comma?
            right abduction left elevation | no comma between
            normal, right abduction  | it cannot be both
            full                     | not the word
            rightabduction           | no space
            """)
    void refusesOtherText(String typed, String source) {
        Refused.assertThat(() -> Ductions.parse(typed)).as(source).saying("ductions", "unreadable", typed);
    }

    @Test
    void allEightMovementsAreShortEnoughAndReadAgain() {
        Ductions all = new Ductions(Set.of(Duction.values()), Set.of(Duction.values()));
        assertThat(Ductions.parse(all.toString())).isEqualTo(all);
        Refused.assertThat(() -> Ductions.parse("a".repeat(150))).saying("ductions", "unreadable");
        Refused.assertThat(() -> Ductions.parse("a".repeat(151))).saying("ductions", "long");
    }

    @Test
    void eachEyeHasItsOwnAndTheMirrorExchangesThem() {
        Ductions ductions = Ductions.parse("right abduction");
        assertThat(ductions.of(Eye.RIGHT)).containsExactly(Duction.ABDUCTION);
        assertThat(ductions.of(Eye.LEFT)).isEmpty();
        assertThat(ductions.swapped()).isEqualTo(Ductions.parse("left abduction"));
        assertThat(ductions.areNormal()).isFalse();
        assertThat(ductions.swapped().areNormal()).isFalse();
        assertThat(Ductions.NORMAL.areNormal()).isTrue();
    }
}
