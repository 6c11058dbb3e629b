package plusward.entry;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.springframework.util.LinkedMultiValueMap;
import org.springframework.util.MultiValueMap;
import plusward.exam.Examination;
import plusward.exam.ExaminationReader;
import plusward.exam.Field;
import plusward.exam.Reason;
import plusward.rules.Suspicion;

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

    @ParameterizedTest
    @CsvSource({"0, 0", "12, 12", "-1, -1", "x, -1", "12345678901, -1", "'', -1"})
    void aVersionThatCannotBeReadIsNoneAndIsNeverTakenForAStoredOne(String sent, int version) {
        assertThat(VisitForm.of(sent("version", sent)).version()).isEqualTo(version);
    }

    @Test
    void whatIsMissingInARequestIsEmpty() {
        VisitForm form = VisitForm.of(sent("unknown", "x"));
        assertThat(form.text().values()).hasSameSizeAs(Field.values()).containsOnly("");
    }

    @Test
    void anExaminationIsTypedAsItWasRead() {
        VisitForm form = VisitForm.of(EARLIER);
        assertThat(ExaminationReader.read(form.text()).examination()).isEqualTo(EARLIER);
        assertThat(EARLIER.date()).isEqualTo(LocalDate.of(2025, 10, 6));
    }

    @Test
    void aPageWithOnlyItsDayAndExaminerIsBlank() {
        VisitForm form = VisitForm.blank().with(Field.VISIT_DATE, "2026-01-05").with(Field.EXAMINER, "R. Tamsin");
        assertThat(form.isBlank()).isTrue();
        assertThat(form.with(Field.NOTE, " ").isBlank()).isTrue();
        assertThat(form.with(Field.NOTE, "x").isBlank()).isFalse();
    }

    @Test
    void everyConfirmationThatWasSentIsKept() {
        LinkedMultiValueMap<String, String> sent = new LinkedMultiValueMap<>();
        sent.add("confirmed", "sign-flipped:worn_right:-3.00");
        sent.add("confirmed", "turn-doubled:turn_cc_near:ET 30");
        VisitForm form = VisitForm.of(sent);
        assertThat(form.hasConfirmed(suspicion("sign-flipped", Field.WORN_RIGHT, "-3.00")))
                .isTrue();
        assertThat(form.hasConfirmed(suspicion("sign-flipped", Field.WORN_RIGHT, "-3.25")))
                .as("another text")
                .isFalse();
        assertThat(form.hasConfirmed(suspicion("sign-flipped", Field.WORN_LEFT, "-3.00")))
                .as("another field")
                .isFalse();
    }

    private static Suspicion suspicion(String code, Field field, String written) {
        return new Suspicion(code, field, written, Reason.of("suspicion." + code));
    }

    private static MultiValueMap<String, String> sent(String name, String value) {
        return MultiValueMap.fromSingleValue(Map.of(name, value));
    }
}
