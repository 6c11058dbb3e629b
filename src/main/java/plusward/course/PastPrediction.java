package plusward.course;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import plusward.exam.TurnCondition;
import plusward.optics.Accommodation;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;

/**
 * A change of glasses that was made: what would have been predicted at the visit before it, and what was then measured.
 *
 * <p>From each two visits that follow one another with other plus or another add, the plus that was really worn then is put
 * into the prediction of the earlier visit. Nothing measured later enters it. In 95 of 100 such pairs the measurement should
 * lie inside the interval, if the child changes in nothing but its glasses; a child that grows, and glasses that were worn for
 * weeks, make it fewer.
 *
 * @param from the visit from which it was predicted
 * @param to the visit at which it was measured
 * @param predicted with its interval for one measurement
 * @param measured the turn, inward positive
 */
public record PastPrediction(LocalDate from, LocalDate to, PredictedTurn predicted, PrismDioptres measured) {

    private static final List<TurnCondition> WITH_GLASSES =
            List.of(TurnCondition.CC_DISTANCE, TurnCondition.CC_NEAR, TurnCondition.ADD_NEAR);

    /** Measured minus predicted, Δ; positive is further inward than predicted. */
    public PrismDioptres error() {
        return measured.minus(predicted.turn().value());
    }

    /** True when the measurement lies in the interval, its ends included. */
    public boolean isInside() {
        return !measured.isUnder(predicted.turn().low())
                && !measured.isOver(predicted.turn().high());
    }

    /** Every change of glasses up to this visit, oldest first. */
    public static List<PastPrediction> upTo(Visit visit) {
        return visit.fromFirst().stream()
                .flatMap(later -> later.before().findFirst().stream().flatMap(earlier -> between(earlier, later)))
                .toList();
    }

    private static Stream<PastPrediction> between(Visit earlier, Visit later) {
        boolean changed = later.glasses().areWorn()
                && earlier.glasses().areWorn()
                && !Worn.isSame(earlier.glasses(), later.glasses());
        return changed
                ? FocusSlope.at(earlier).stream()
                        .flatMap(slope -> WITH_GLASSES.stream()
                                .flatMap(condition -> of(earlier, later, condition, slope).stream()))
                : Stream.empty();
    }

    private static Optional<PastPrediction> of(Visit earlier, Visit later, TurnCondition condition, FocusSlope slope) {
        PrismDioptres measured = later.exam().turns().signedAt(condition);
        if (measured == null) {
            return Optional.empty();
        }
        return VisitModel.at(earlier).readings().stream()
                .filter(reading -> reading.condition() == condition)
                .findFirst()
                .map(reading -> new PastPrediction(
                        earlier.date(),
                        later.date(),
                        PredictedTurn.of(reading, slope, focusing(earlier, later, condition)),
                        measured));
    }

    /** The focusing that the later glasses leave, by the hyperopia known at the earlier visit. */
    private static Dioptres focusing(Visit earlier, Visit later, TurnCondition condition) {
        Dioptres hyperopia = CycloplegicInForce.at(earlier).orElseThrow().hyperopia();
        Dioptres worn = Worn.meanEquivalent(later.glasses()).orElseThrow();
        if (condition == TurnCondition.CC_DISTANCE) {
            return Accommodation.neededForDistance(hyperopia, worn);
        }
        boolean throughAdd = condition == TurnCondition.ADD_NEAR;
        return Accommodation.neededForNear(
                hyperopia, worn, throughAdd ? later.glasses().asOrdered().addOrZero() : Dioptres.ZERO);
    }
}
