package plusward.entry;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.Examination;
import plusward.exam.ExaminationReader;
import plusward.exam.Field;

class VisitFormTests {

    private static final Examination EARLIER = ExaminationReader.read(Map.of(
                    Field.VISIT_DATE, "2025-10-06",
                    Field.WORN_RIGHT, "+4.25 -0.50 x 180",
                    Field.WORN_ADD, "+2.50",
                    Field.WORN_SINCE, "2024-09-30",
                    Field.SEGMENT_STYLE, "round",
                    Field.SEGMENT_RIGHT_MM, "-2.0",
                    Field.WEAR_HOURS, "13",
                    Field.MADE_RIGHT, "+4.25",
                    Field.TURN_CC_NEAR, "E 6"))
            .examination();

    @Test
    void copiesTheGlassesOfTheVisitBeforeAndNeverAMeasurement() {
        VisitForm typed = VisitForm.of(Map.of("worn_left", "+9.00", "turn_cc_near", "ET 20", "examiner", "R. Tamsin"));
        VisitForm copied = typed.withGlassesOf(EARLIER);
        assertThat(copied.at(Field.WORN_RIGHT)).isEqualTo("+4.25 -0.50 x 180");
        assertThat(copied.at(Field.WORN_LEFT)).as("the visit before had none").isEmpty();
        assertThat(copied.at(Field.WORN_ADD)).isEqualTo("+2.50");
        assertThat(copied.at(Field.WORN_SINCE)).isEqualTo("2024-09-30");
        assertThat(copied.at(Field.SEGMENT_STYLE)).isEqualTo("round");
        assertThat(copied.at(Field.SEGMENT_RIGHT_MM)).isEmpty();
        assertThat(copied.at(Field.MADE_RIGHT)).isEmpty();
        assertThat(copied.at(Field.WEAR_HOURS)).isEmpty();
        assertThat(copied.at(Field.VISIT_DATE)).isEmpty();
        assertThat(copied.at(Field.TURN_CC_NEAR)).isEqualTo("ET 20");
        assertThat(copied.at(Field.EXAMINER)).isEqualTo("R. Tamsin");
    }

    @ParameterizedTest
    @CsvSource({"0, 0", "12, 12", "-1, -1", "x, -1", "12345678901, -1", "'', -1"})
    void aVersionThatCannotBeReadIsNoneAndIsNeverTakenForAStoredOne(String sent, int version) {
        assertThat(VisitForm.of(Map.of("version", sent)).version()).isEqualTo(version);
    }

    @Test
    void whatIsMissingInARequestIsEmpty() {
        VisitForm form = VisitForm.of(Map.of("unknown", "x"));
        assertThat(form.text().values()).hasSameSizeAs(Field.values()).containsOnly("");
    }

    @Test
    void anExaminationIsTypedAsItWasRead() {
        VisitForm form = VisitForm.of(EARLIER);
        assertThat(ExaminationReader.read(form.text()).examination()).isEqualTo(EARLIER);
        assertThat(EARLIER.date()).isEqualTo(LocalDate.of(2025, 10, 6));
    }
}
