package plusward.readback;

import static org.assertj.core.api.Assertions.assertThat;

import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import plusward.exam.ExaminationReader;
import plusward.exam.Field;
import plusward.exam.Gaze;
import plusward.exam.TurnCondition;

class TurnReadsTests {

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', useHeadersInDisplayName = true, textBlock = """
            typed, Δ     | read back                                                                   | source
            ET 25        | inward, shows all the time, 25 Δ                                            | eso, manifest
            et 25        | inward, shows all the time, 25 Δ                                            | only the case differs
            ET25         | read as ET 25 · inward, shows all the time, 25 Δ                            | written otherwise
            ET' 25       | read as ET 25 · inward, shows all the time, 25 Δ                            | the field says that it is near
            E(T) 14      | inward, shows at times, 14 Δ                                                | eso, intermittent
            E 6.5        | inward, only under cover, 6.5 Δ                                             | eso, latent
            XT 25        | outward, shows all the time, 25 Δ                                           | exo, manifest
            X(T) 14      | outward, shows at times, 14 Δ                                               | exo, intermittent
            X 4          | outward, only under cover, 4 Δ                                              | exo, latent
            ET 30+25     | inward, shows all the time, 59.5 Δ                                          | (30 + 25) / (1 - 30 x 25 / 10 000) = 55 / 0.925 = 59.46
            XT 20+20     | outward, shows all the time, 41.7 Δ                                         | 40 / (1 - 400 / 10 000) = 41.67
            RHT 4        | right eye higher, shows all the time, 4 Δ                                   | vertical, manifest
            LH(T) 3      | left eye higher, shows at times, 3 Δ                                        | vertical, intermittent
            LH 3         | left eye higher, only under cover, 3 Δ                                      | vertical, latent
            E(T) 14 RH 2 | inward, shows at times, 14 Δ · right eye higher, only under cover, 2 Δ      | both
            ortho        | no turn                                                                     | straight is a finding
            ET 0         | read as ortho · no turn                                                     | 0 has no direction
            """)
    void aTurnIsReadBackInWords(String typed, String readBack, String source) {
        assertThat(Reread.field(Field.TURN_CC_NEAR, null, typed)).as(source).isEqualTo(readBack);
    }

    /** A change is likely real from 6 Δ, from 12 Δ when either reading is over 20 Δ (as the repeatability of the course). */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, nullValues = "-", textBlock = """
            before   | now      | change                                           | source
            -        | ET 8     | -                                                | nothing to compare with
            E 8      | E 14     | 6 Δ further in since 2024-03-14: likely real     | 14 - 8, at the limit
            E 8      | E 13.9   | 5.9 Δ further in since 2024-03-14: may be noise  | just under it
            E 20     | E 14     | 6 Δ further out since 2024-03-14: likely real    | neither is over 20
            E 20     | E 14.1   | 5.9 Δ further out since 2024-03-14: may be noise | just under it
            ET 20.1  | ET 8.1   | 12 Δ further out since 2024-03-14: likely real   | one is over 20, at the limit
            ET 20.1  | ET 8.2   | 11.9 Δ further out since 2024-03-14: may be noise | just under it
            ET 13.1  | ET 25.1  | 12 Δ further in since 2024-03-14: likely real    | the later one is over 20
            X 4      | E 2      | 6 Δ further in since 2024-03-14: likely real     | 2 - (-4), through straight
            X 2      | X 8      | 6 Δ further out since 2024-03-14: likely real    | -8 - (-2)
            ortho    | E 6      | 6 Δ further in since 2024-03-14: likely real     | straight is 0
            ET 6     | ET 6     | same size as on 2024-03-14                       | 0
            E 6      | ET 6     | same size as on 2024-03-14                       | the same size, though it shows now
            ortho    | ortho    | as on 2024-03-14                                 | straight both times
            ET 30+25 | ET 59.5  | same size as on 2024-03-14                       | 59.46 prints as 59.5
            RHT 4    | ET 8     | -                                                | no horizontal part before
            ET 8     | RHT 4    | -                                                | none now
            """)
    void theChangeIsSaidToBeRealOrNoiseUnderEveryCondition(
            @Nullable String before, String now, @Nullable String change, String source) {
        for (TurnCondition condition : TurnCondition.values()) {
            Field field = ExaminationReader.fieldOf(condition);
            String alone = Reread.field(field, null, now);
            assertThat(Reread.field(field, before, now))
                    .as("%s, %s", source, field)
                    .isEqualTo(change == null ? alone : alone + " · " + change);
        }
    }

    @Test
    void likeIsComparedWithLikeOnly() {
        ReadBack read = Reread.among("""
                visit_date | turn_cc_distance | turn_cc_near
                2023-03-14 | ET 10            | ET 30
                2024-03-14 |                  | ET 40
                """, "turn_cc_distance=ET 12");
        assertThat(Reread.words(read.at(Field.TURN_CC_DISTANCE).understood()))
                .isEqualTo("inward, shows all the time, 12 Δ · 2 Δ further in since 2023-03-14: may be noise");
    }

    @ParameterizedTest
    @EnumSource
    void aTurnInADirectionOfGazeIsReadBackWithoutAChange(Gaze gaze) {
        assertThat(Reread.field(ExaminationReader.fieldOf(gaze), "ET 10", "E(T) 14 RH 2"))
                .isEqualTo("inward, shows at times, 14 Δ · right eye higher, only under cover, 2 Δ");
    }
}
