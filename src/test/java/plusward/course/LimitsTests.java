package plusward.course;

import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.assertj.core.api.ThrowableAssert.ThrowingCallable;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.HoursPerDay;
import plusward.optics.Millimetres;
import plusward.optics.PrismDioptres;

class LimitsTests {

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            turn (Δ) | tolerance (mm) | pupil (mm) | weeks | months | days | accepted | why
            0.1      | 0              | 0.1        | 0     | 1      | 0    | true     | the least that means something
            0        | 1              | 4.5        | 8     | 12     | 90   | false    | every turn would break
            10       | -0.1           | 4.5        | 8     | 12     | 90   | false    | a tolerance below 0
            10       | 1              | 0          | 8     | 12     | 90   | false    | no pupil
            10       | 1              | 4.5        | -1    | 12     | 90   | false    | weeks below 0
            10       | 1              | 4.5        | 8     | 0      | 90   | false    | due at once, always
            10       | 1              | 4.5        | 8     | 12     | -1   | false    | days below 0
            """)
    void what_no_clinic_can_mean_is_refused(
            double turn,
            double tolerance,
            double pupil,
            int weeks,
            int months,
            int days,
            boolean accepted,
            String why) {
        ThrowingCallable making = () -> new Limits(
                PrismDioptres.of(turn),
                Millimetres.of(tolerance),
                Millimetres.of(pupil),
                HoursPerDay.of(8),
                weeks,
                months,
                days);
        if (accepted) {
            assertThatCode(making).as(why).doesNotThrowAnyException();
        } else {
            assertThatThrownBy(making).as(why).isInstanceOf(IllegalArgumentException.class);
        }
    }
}
