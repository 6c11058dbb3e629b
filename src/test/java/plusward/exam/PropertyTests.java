package plusward.exam;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import java.time.Duration;
import java.util.EnumMap;
import java.util.Map;
import java.util.function.Consumer;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import plusward.optics.Lens;

/** What must hold for any measure and any text, tried on some thousands from a fixed seed. */
class PropertyTests {

    /** Measures tried for each property. */
    private static final int MANY = 2000;

    /** Whole visits tried for each property; a visit holds some fifty measures. */
    private static final int SOME = 400;

    private final Generator generator = new Generator(20260314);

    @Test
    void aLensIsReadAsItIsWritten() {
        many(g -> {
            Lens lens = g.lens();
            assertThat(LensNotation.parse(lens.toString())).isEqualTo(lens);
        });
    }

    @Test
    void bothCylinderFormsAreTheSamePower() {
        many(g -> {
            Lens lens = g.lens();
            assertThat(lens.inPlusCylinder().isSamePowerAs(lens.inMinusCylinder()))
                    .as("%s", lens)
                    .isTrue();
            assertThat(lens.transposed().transposed()).isEqualTo(lens);
            assertThat(lens.transposed().sphericalEquivalent()).isEqualTo(lens.sphericalEquivalent());
        });
    }

    @Test
    void aTurnIsReadAsItIsWritten() {
        many(g -> {
            Turn turn = g.turn();
            assertThat(Turn.parse(turn.toString(), Viewing.DISTANCE)).isEqualTo(turn);
        });
    }

    @Test
    void anAcuityIsReadAsItIsWritten() {
        many(g -> {
            Acuity acuity = g.acuity();
            assertThat(Acuity.parse(acuity.toString())).isEqualTo(acuity);
        });
    }

    @Test
    void stereoacuityIsReadAsItIsWritten() {
        many(g -> {
            Stereo stereo = g.stereo();
            assertThat(Stereo.parse(stereo.toString())).isEqualTo(stereo);
        });
    }

    @Test
    void aHeightIsReadAsItIsWritten() {
        many(g -> {
            var height = g.height();
            assertThat(MeasureNotation.height(height.toString())).isEqualTo(height);
        });
    }

    @Test
    void ductionsAreReadAsTheyAreWritten() {
        many(g -> {
            Ductions ductions = g.ductions();
            assertThat(Ductions.parse(ductions.toString())).isEqualTo(ductions);
        });
    }

    @Test
    void aVisitIsReadAsItIsWritten() {
        some(g -> {
            Examination visit = g.examination();
            ExaminationReader.Result result = ExaminationReader.read(ExaminationWriter.write(visit));
            assertThat(result.refusals()).isEmpty();
            assertThat(result.examination()).isEqualTo(visit);
        });
    }

    @Test
    void mirroredTwiceIsTheSame() {
        some(g -> {
            Examination visit = g.examination();
            assertThat(visit.mirrored().mirrored()).isEqualTo(visit);
            assertThat(ExaminationReader.read(ExaminationWriter.write(visit.mirrored()))
                            .examination())
                    .isEqualTo(visit.mirrored());
        });
    }

    @Test
    void anyTextIsEitherReadOrRefused() {
        some(g -> {
            Map<Field, String> fields = g.fields();
            ExaminationReader.Result result = ExaminationReader.read(fields);
            assertThat(result.examination() == null)
                    .as("%s", fields)
                    .isEqualTo(!result.refusals().isEmpty());
        });
    }

    @Test
    void whatWasReadCanBeWrittenAndReadAgain() {
        some(g -> {
            Map<Field, String> fields = g.fields();
            ExaminationReader.read(fields).refusals().forEach(refusal -> fields.remove(refusal.field()));
            fields.putIfAbsent(Field.VISIT_DATE, "2026-03-14");
            Examination visit = ExaminationReader.read(fields).examination();
            assertThat(visit).isNotNull();
            assertThat(ExaminationReader.read(ExaminationWriter.write(visit)).examination())
                    .isEqualTo(visit);
        });
    }

    @Test
    void aMegabyteInEveryFieldIsRefusedAtOnceAndNotRepeated() {
        for (int i = 0; i < 20; i++) {
            Map<Field, String> fields = new EnumMap<>(Field.class);
            String text = "q" + generator.megabyte() + "q";
            for (Field field : Field.values()) {
                fields.put(field, text);
            }
            var result = assertTimeoutPreemptively(Duration.ofSeconds(5), () -> ExaminationReader.read(fields));
            assertThat(result.refusals()).hasSameSizeAs(Field.values());
            assertThat(result.refusals()).allSatisfy(refusal -> {
                assertThat(refusal.problem().read()).hasSizeLessThan(100);
                assertThat(refusal.problem().getMessage()).endsWith(".long");
            });
        }
    }

    @Test
    void aMegabyteOfAnythingIsReadOrRefusedAtOnce() {
        for (int i = 0; i < 30; i++) {
            Map<Field, String> fields = new EnumMap<>(Field.class);
            String text = generator.megabyte();
            for (Field field : Field.values()) {
                fields.put(field, text);
            }
            var result = assertTimeoutPreemptively(Duration.ofSeconds(5), () -> ExaminationReader.read(fields));
            assertThat(result.examination()).isNull();
        }
    }

    /** The longest text that gets past the limit on length, in the shapes that make a pattern backtrack. */
    @Test
    void theLongestTextThatIsLookedAtIsRefusedAtOnce() {
        for (String part : new String[] {
            " ", "9", "1 ", "+1", "+1 ", ".", "PD", "'", "-1 ", "X", "T", "25 + ", "R ABDUCTION,", "OD "
        }) {
            for (String start : new String[] {"+3.50", "25", "ET 25", "20/25", "E"}) {
                String text = (start + part.repeat(60)).substring(0, Notation.LONGEST - 1) + "!";
                Map<Field, String> fields = new EnumMap<>(Field.class);
                for (Field field : Field.values()) {
                    fields.put(field, text);
                }
                assertTimeoutPreemptively(Duration.ofSeconds(1), () -> ExaminationReader.read(fields));
            }
        }
    }

    private void some(Consumer<Generator> property) {
        IntStream.range(0, SOME).forEach(i -> property.accept(generator));
    }

    private void many(Consumer<Generator> property) {
        IntStream.range(0, MANY).forEach(i -> property.accept(generator));
    }
}
