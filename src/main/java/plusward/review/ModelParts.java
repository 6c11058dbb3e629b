package plusward.review;

import java.util.List;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import plusward.course.Estimate;
import plusward.course.FocusReading;
import plusward.course.Visit;
import plusward.course.VisitModel;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;
import plusward.review.CourseDocument.LinePoint;
import plusward.review.CourseDocument.ModelPart;
import plusward.review.CourseDocument.ReadingPart;
import plusward.web.Sentences;

/** Writes the model of a visit, with the fitted line and its band for the chart. */
final class ModelParts {

    private static final int STEPS = 20;

    private final Sentences sentences;

    ModelParts(Sentences sentences) {
        this.sentences = sentences;
    }

    ModelPart of(Visit visit) {
        VisitModel model = VisitModel.at(visit);
        return new ModelPart(
                value(model.base()),
                value(model.perDioptre()),
                value(model.nearExtra()),
                low(model.base()),
                high(model.base()),
                low(model.perDioptre()),
                high(model.perDioptre()),
                low(model.nearExtra()),
                high(model.nearExtra()),
                model.readings().size(),
                model.readings().stream().map(ModelParts::reading).toList(),
                line(model, PrismDioptres.ZERO),
                model.nearExtra() == null
                        ? List.of()
                        : line(model, model.nearExtra().value()),
                model.notes().stream().map(sentences::of).toList());
    }

    private static ReadingPart reading(FocusReading reading) {
        return new ReadingPart(
                DerivedParts.name(reading.condition()),
                Numbers.plain(reading.accommodation()),
                Numbers.plain(reading.turn()));
    }

    private static List<LinePoint> line(VisitModel model, PrismDioptres extra) {
        double furthest = model.readings().stream()
                .mapToDouble(reading -> reading.accommodation().amount())
                .max()
                .orElse(0);
        return IntStream.rangeClosed(0, STEPS)
                .mapToObj(step -> Dioptres.of(furthest * step / STEPS))
                .flatMap(need -> model.expectedAtDistance(need).map(turn -> point(need, turn, extra)).stream())
                .toList();
    }

    private static LinePoint point(Dioptres need, Estimate<PrismDioptres> turn, PrismDioptres extra) {
        return new LinePoint(
                Numbers.plain(need),
                Numbers.plain(turn.value().plus(extra)),
                Numbers.plain(turn.low().plus(extra)),
                Numbers.plain(turn.high().plus(extra)));
    }

    private static @Nullable Double value(@Nullable Estimate<?> estimate) {
        return estimate == null ? null : Numbers.plain(estimate.value());
    }

    private static @Nullable Double low(@Nullable Estimate<?> estimate) {
        return estimate == null ? null : Numbers.plain(estimate.low());
    }

    private static @Nullable Double high(@Nullable Estimate<?> estimate) {
        return estimate == null ? null : Numbers.plain(estimate.high());
    }
}
