package plusward.course;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.exam.Eye;
import plusward.exam.PerEye;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.optics.Accommodation;
import plusward.optics.Dioptres;
import plusward.optics.PrismPerDioptre;

/**
 * What other plus, or another add, is predicted to do to the turn at a visit; or why nothing can be predicted.
 *
 * <p>Plus changes from −1.00 to +1.00 D in steps of 0.25, the same in both eyes; adds from 0 to +3.50 in steps of 0.25. Refused
 * as a whole without glasses, without a cycloplegic refraction of the last 24 months, without a turn measured with the glasses,
 * and without a slope that may be used. A step is refused that would put more plus before an eye than its cycloplegic refraction
 * and 0.50 D, or that asks for more focusing than a child keeps up (three quarters of Hofstetter's least amplitude). It advises
 * nothing: what a lower plus does to this child, only the child shows.
 *
 * @param refusals why nothing is predicted; empty when something is
 * @param slope turn for each dioptre of focusing, with its interval; absent when refused
 * @param visits how many visits the slope comes from
 * @param steps the changes of plus with the add as worn, from less to more
 * @param adds the adds with the plus as worn, from none to the strongest
 */
public record PlusTrial(
        List<Reason> refusals,
        @Nullable Estimate<PrismPerDioptre> slope,
        int visits,
        List<Step> steps,
        List<Step> adds) {

    private static final int STEPS_EITHER_WAY = 4;
    private static final int ADD_STEPS = 14;
    private static final Dioptres STEP = Dioptres.of(0.25);

    public PlusTrial {
        refusals = List.copyOf(refusals);
        steps = List.copyOf(steps);
        adds = List.copyOf(adds);
    }

    /**
     * One change.
     *
     * @param change dioptres of plus more in both eyes, negative less
     * @param add the add, 0 for none
     * @param turns distance, near, and near through the add, as far as they can be predicted; empty when refused
     * @param refused why this step is not predicted; absent when it is
     */
    public record Step(
            Dioptres change,
            Dioptres add,
            List<PredictedTurn> turns,
            @Nullable Reason refused) {

        public Step {
            turns = List.copyOf(turns);
        }

        /** The prediction of one turn; empty when it is not predicted. */
        public Optional<PredictedTurn> at(TurnCondition condition) {
            return turns.stream().filter(turn -> turn.condition() == condition).findFirst();
        }
    }

    public static PlusTrial at(Visit visit) {
        Optional<FocusSlope> slope = FocusSlope.at(visit);
        List<Reason> refusals = refusals(visit, slope);
        if (!refusals.isEmpty() || slope.isEmpty()) {
            return new PlusTrial(refusals, null, 0, List.of(), List.of());
        }
        Predictor predictor = new Predictor(visit, slope.get());
        Dioptres worn = visit.glasses().asOrdered().addOrZero();
        return new PlusTrial(
                List.of(),
                slope.get().estimate(),
                slope.get().visits(),
                IntStream.rangeClosed(-STEPS_EITHER_WAY, STEPS_EITHER_WAY)
                        .mapToObj(i -> predictor.step(STEP.times(i), worn))
                        .toList(),
                IntStream.rangeClosed(0, ADD_STEPS)
                        .mapToObj(i -> predictor.step(Dioptres.ZERO, STEP.times(i)))
                        .toList());
    }

    private static List<Reason> refusals(Visit visit, Optional<FocusSlope> slope) {
        List<Reason> refusals = new ArrayList<>();
        if (!visit.glasses().areWorn()) {
            refusals.add(Reason.of("prediction.no-glasses"));
        }
        if (CycloplegicInForce.at(visit).isEmpty()) {
            refusals.add(Reason.of("prediction.no-cycloplegic"));
        }
        boolean measured = Stream.of(TurnCondition.CC_DISTANCE, TurnCondition.CC_NEAR, TurnCondition.ADD_NEAR)
                .anyMatch(condition -> visit.exam().turns().signedAt(condition) != null);
        if (!measured) {
            refusals.add(Reason.of("prediction.no-turn"));
        }
        if (refusals.isEmpty() && slope.isEmpty()) {
            refusals.add(Reason.of("prediction.no-slope"));
        }
        return refusals;
    }

    /** Predicts the turns of one visit. */
    private static final class Predictor {

        private final Visit visit;
        private final FocusSlope slope;
        private final Dioptres hyperopia;
        private final Dioptres worn;

        Predictor(Visit visit, FocusSlope slope) {
            this.visit = visit;
            this.slope = slope;
            this.hyperopia = CycloplegicInForce.at(visit).orElseThrow().hyperopia();
            this.worn = Worn.meanEquivalent(visit.glasses()).orElseThrow();
        }

        Step step(Dioptres change, Dioptres add) {
            Reason refused = refused(change);
            List<PredictedTurn> turns = refused != null
                    ? List.of()
                    : Stream.of(
                                    predicted(TurnCondition.CC_DISTANCE, change, add),
                                    predicted(TurnCondition.CC_NEAR, change, add),
                                    predicted(TurnCondition.ADD_NEAR, change, add))
                            .flatMap(Optional::stream)
                            .toList();
            return new Step(change, add, turns, refused);
        }

        /** More plus than the cycloplegic refraction and 0.50 D, or more focusing than is kept up. */
        private @Nullable Reason refused(Dioptres change) {
            PerEye<Dioptres> shortBy = Worn.shortBy(visit);
            for (Eye eye : Eye.values()) {
                Dioptres missing = shortBy.of(eye);
                if (missing != null && change.minus(missing).isOver(Worn.FULL_WITHIN)) {
                    String key = eye == Eye.RIGHT ? "prediction.too-much-plus.right" : "prediction.too-much-plus.left";
                    return Reason.of(key, change.minus(missing), Worn.FULL_WITHIN);
                }
            }
            Dioptres need = Accommodation.neededForDistance(hyperopia, worn.plus(change));
            Dioptres sustainable = FocusReadings.sustainable(visit);
            return need.isOver(sustainable) ? Reason.of("prediction.too-much-focusing", need, sustainable) : null;
        }

        private Optional<PredictedTurn> predicted(TurnCondition condition, Dioptres change, Dioptres add) {
            boolean throughAdd = condition == TurnCondition.ADD_NEAR;
            if (throughAdd && add.equals(Dioptres.ZERO)) {
                return Optional.empty();
            }
            Dioptres then = focusing(condition, worn.plus(change), throughAdd ? add : Dioptres.ZERO);
            return reading(condition)
                    .or(() ->
                            throughAdd ? reading(TurnCondition.CC_NEAR).map(Predictor::asThroughAdd) : Optional.empty())
                    .map(reading -> PredictedTurn.of(reading, slope, then));
        }

        /** Without a reading through an add, that at near through the distance part is the start. */
        private static FocusReading asThroughAdd(FocusReading near) {
            return new FocusReading(TurnCondition.ADD_NEAR, near.accommodation(), near.turn());
        }

        private Optional<FocusReading> reading(TurnCondition condition) {
            return VisitModel.at(visit).readings().stream()
                    .filter(reading -> reading.condition() == condition)
                    .findFirst();
        }

        private Dioptres focusing(TurnCondition condition, Dioptres plus, Dioptres add) {
            return condition == TurnCondition.CC_DISTANCE
                    ? Accommodation.neededForDistance(hyperopia, plus)
                    : Accommodation.neededForNear(hyperopia, plus, add);
        }
    }
}
