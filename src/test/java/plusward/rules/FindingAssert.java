package plusward.rules;

import java.util.Locale;
import java.util.Map;
import org.assertj.core.api.AbstractAssert;
import org.assertj.core.api.Assertions;

/** Says what a rule answered: {@code assertThat(finding).answers("act").says("right 1.5 mm")}. */
final class FindingAssert extends AbstractAssert<FindingAssert, Finding> {

    private FindingAssert(Finding finding) {
        super(finding, FindingAssert.class);
    }

    static FindingAssert assertThat(Finding finding) {
        return new FindingAssert(finding);
    }

    /** In one word: {@code act}, {@code look} or {@code note} when met; {@code no} when not; {@code unknown} when undecided. */
    static String answer(Finding finding) {
        return finding instanceof Finding.Met met
                ? met.weight().name().toLowerCase(Locale.ROOT)
                : finding instanceof Finding.NotMet ? "no" : "unknown";
    }

    FindingAssert answers(String word) {
        Assertions.assertThat(answer(actual))
                .as("%s: %s", descriptionText(), Worded.of(actual.because()))
                .isEqualTo(word);
        return this;
    }

    FindingAssert isMet(Weight weight) {
        return answers(weight.code());
    }

    FindingAssert isNotMet() {
        return answers("no");
    }

    FindingAssert isUndecided() {
        return answers("unknown");
    }

    /** The sentence, as a reader of English sees it, contains each of these. */
    FindingAssert says(String... parts) {
        Assertions.assertThat(Worded.of(actual.because())).as(descriptionText()).contains(parts);
        return this;
    }

    /** The whole sentence, as a reader of English sees it. */
    FindingAssert reads(String sentence) {
        Assertions.assertThat(Worded.of(actual.because())).as(descriptionText()).isEqualTo(sentence);
        return this;
    }

    /** The numbers behind a finding that is met, all of them, in order. */
    FindingAssert hasEvidence(String written) {
        Assertions.assertThat(evidence().toString()).as(descriptionText()).isEqualTo("{" + written + "}");
        return this;
    }

    FindingAssert hasChecks(int count) {
        Assertions.assertThat(((Finding.Met) actual).checkFirst())
                .as(descriptionText())
                .hasSize(count)
                .allSatisfy(line -> Assertions.assertThat(Worded.of(line)).isNotBlank());
        return this;
    }

    private Map<String, Object> evidence() {
        Assertions.assertThat(actual).isInstanceOf(Finding.Met.class);
        return ((Finding.Met) actual).evidence();
    }
}
