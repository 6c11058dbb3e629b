package plusward.exam;

import org.assertj.core.api.AbstractAssert;
import org.assertj.core.api.Assertions;
import org.assertj.core.api.ThrowableAssert.ThrowingCallable;

/** Asserts that a text was refused, and as what. */
final class Refused extends AbstractAssert<Refused, Throwable> {

    private Refused(Throwable thrown) {
        super(thrown, Refused.class);
    }

    static Refused assertThat(ThrowingCallable reading) {
        return new Refused(Assertions.catchThrowable(reading));
    }

    Refused saying(String notation, String problem) {
        Assertions.assertThat(actual).as(info.descriptionText()).isInstanceOf(NotationException.class);
        NotationException refusal = (NotationException) actual;
        Assertions.assertThat(refusal.reason().key())
                .as(info.descriptionText())
                .isEqualTo("notation." + notation + "." + problem);
        Assertions.assertThat(refusal.accepted()).isEqualTo(Reason.of("notation." + notation + ".accepted"));
        return this;
    }

    Refused saying(String notation, String problem, String read) {
        saying(notation, problem);
        Assertions.assertThat(((NotationException) actual).read()).isEqualTo(read);
        Assertions.assertThat(((NotationException) actual).reason().values()).containsExactly(read);
        return this;
    }
}
