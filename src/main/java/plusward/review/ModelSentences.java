package plusward.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import plusward.course.Estimate;
import plusward.course.GradientAca;
import plusward.course.HeterophoriaAca;
import plusward.course.Visit;
import plusward.course.VisitModel;
import plusward.exam.Reason;
import plusward.optics.PrismDioptres;
import plusward.optics.PrismPerDioptre;

/** How much of the turn focusing explains, in a sentence with its uncertainty. */
final class ModelSentences {

    private ModelSentences() {}

    static List<Reason> at(Visit visit) {
        VisitModel model = VisitModel.at(visit);
        List<Reason> sentences = new ArrayList<>();
        slope(model).ifPresent(sentences::add);
        part(model.base(), "review.model.base").ifPresent(sentences::add);
        part(model.nearExtra(), "review.model.near-extra").ifPresent(sentences::add);
        sentences.addAll(model.notes());
        GradientAca.at(visit).ifPresent(aca -> sentences.add(ratio("review.aca.gradient", aca.ratio(), aca.from())));
        HeterophoriaAca.at(visit)
                .ifPresent(aca -> sentences.add(ratio("review.aca.heterophoria", aca.ratio(), aca.from())));
        return sentences;
    }

    private static Optional<Reason> slope(VisitModel model) {
        Estimate<PrismPerDioptre> slope = model.perDioptre();
        return slope == null
                ? Optional.empty()
                : Optional.of(Reason.of(
                        "review.model.slope",
                        forOneDioptre(slope.value()),
                        forOneDioptre(slope.low()),
                        forOneDioptre(slope.high()),
                        model.readings().size()));
    }

    private static PrismDioptres forOneDioptre(PrismPerDioptre slope) {
        return PrismDioptres.of(slope.amount());
    }

    private static Optional<Reason> part(@Nullable Estimate<PrismDioptres> part, String key) {
        return part == null ? Optional.empty() : Optional.of(Reason.of(key, part.value(), part.low(), part.high()));
    }

    private static Reason ratio(String key, Estimate<PrismPerDioptre> ratio, Reason from) {
        return Reason.of(key, ratio.value(), ratio.low(), ratio.high(), from);
    }
}
