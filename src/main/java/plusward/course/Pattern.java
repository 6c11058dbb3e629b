package plusward.course;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.exam.Turns;
import plusward.optics.PrismDioptres;

/**
 * What kind of turn this is, judged at the latest visit at which control can be judged, always with its reasons.
 *
 * <p>The first of these that fits: turned out; lost control (held before, now breaking at distance, risen there by a real
 * amount since: deterioration, Ludwig 1988); undetermined while full plus is not on or not yet worn for the weeks in which a
 * turn settles; convergence excess (distance holds, near exceeds distance by 10 Δ or more, Ludwig 1988); fully
 * accommodative; partly accommodative (plus lowers the turn by a real amount where it breaks); non-accommodative (it does
 * not); undetermined.
 *
 * @param kind the pattern
 * @param because the facts that led to it, or what is missing
 */
public record Pattern(PatternKind kind, List<Reason> because) {

    /** Near minus distance with glasses that makes convergence excess: 10 Δ (Ludwig et al. 1988). */
    public static final PrismDioptres EXCESS_FROM = PrismDioptres.of(10);

    public Pattern {
        because = List.copyOf(because);
    }

    /** Judged from this visit and earlier ones only. */
    public static Pattern at(Visit visit, Limits limits) {
        Optional<Visit> assessable = visit.upToHere()
                .filter(each -> Control.at(each, limits).state().isAssessable())
                .findFirst();
        return assessable
                .map(each -> new Judge(each, limits).pattern())
                .orElseGet(() -> undetermined(Reason.of("pattern.no-assessable-visit")));
    }

    /** The pattern at the latest visit; undetermined while there is none. */
    public static Pattern of(Course course, Limits limits) {
        return course.latest()
                .map(visit -> at(visit, limits))
                .orElseGet(() -> undetermined(Reason.of("pattern.no-assessable-visit")));
    }

    private static Pattern undetermined(Reason... because) {
        return new Pattern(PatternKind.UNDETERMINED, List.of(because));
    }

    private static final class Judge {

        private final Visit visit;
        private final Limits limits;
        private final ControlState state;
        private final Turns turns;
        private final Reason judgedAt;

        Judge(Visit visit, Limits limits) {
            this.visit = visit;
            this.limits = limits;
            this.state = Control.at(visit, limits).state();
            this.turns = visit.exam().turns();
            this.judgedAt = Reason.of("pattern.judged-at", visit.date(), Reason.of("control.state." + state.code()));
        }

        Pattern pattern() {
            if (CycloplegicInForce.at(visit).isEmpty()) {
                return undetermined(judgedAt, Reason.of("pattern.no-cycloplegic"));
            }
            if (state == ControlState.TURNED_OUT) {
                return because(PatternKind.TURNED_OUT, Reason.of("pattern.turned-out"));
            }
            return lostControl().or(this::notSettled).or(this::excess).orElseGet(this::byEffectOfPlus);
        }

        private Optional<Pattern> lostControl() {
            PrismDioptres now = turns.signedAt(TurnCondition.CC_DISTANCE);
            if (now == null || !breaks(TurnCondition.CC_DISTANCE)) {
                return Optional.empty();
            }
            return visit.lastBefore(each -> Control.at(each, limits).state().isHeld())
                    .flatMap(held -> Optional.ofNullable(held.exam().turns().signedAt(TurnCondition.CC_DISTANCE))
                            .filter(then -> Repeatability.isRealRise(then, now))
                            .map(then -> because(
                                    PatternKind.LOST_CONTROL,
                                    Reason.of(
                                            "pattern.rose-since",
                                            held.date(),
                                            then,
                                            now,
                                            Repeatability.realFrom(then, now)))));
        }

        private Optional<Pattern> notSettled() {
            if (breaking().findAny().isEmpty()) {
                return Optional.empty();
            }
            List<Reason> why = Stream.concat(plusNotFull(), tooSoon()).toList();
            return why.isEmpty()
                    ? Optional.empty()
                    : Optional.of(new Pattern(
                            PatternKind.UNDETERMINED,
                            Stream.concat(Stream.of(judgedAt), why.stream()).toList()));
        }

        private Stream<Reason> plusNotFull() {
            return switch (Worn.fullness(visit)) {
                case SHORT ->
                    Worn.shortBy(visit)
                            .measured()
                            .max(Comparator.naturalOrder())
                            .map(most -> Reason.of("pattern.plus-short", Worn.FULL_WITHIN, most))
                            .stream();
                case UNKNOWN -> Stream.of(Reason.of("pattern.plus-unknown"));
                case FULL -> Stream.empty();
            };
        }

        private Stream<Reason> tooSoon() {
            return Settling.at(visit, limits) == Settling.TOO_SOON
                    ? Stream.of(Reason.of("pattern.too-soon", limits.settleWeeks()))
                    : Stream.empty();
        }

        private Optional<Pattern> excess() {
            PrismDioptres distance = turns.signedAt(TurnCondition.CC_DISTANCE);
            PrismDioptres near = turns.signedAt(TurnCondition.CC_NEAR);
            if (distance == null || near == null || breaks(TurnCondition.CC_DISTANCE)) {
                return Optional.empty();
            }
            PrismDioptres gap = near.minus(distance);
            return gap.isUnder(EXCESS_FROM)
                    ? Optional.empty()
                    : Optional.of(
                            because(PatternKind.CONVERGENCE_EXCESS, Reason.of("pattern.near-gap", gap, EXCESS_FROM)));
        }

        private Pattern byEffectOfPlus() {
            if (state.isHeld()) {
                return because(PatternKind.FULLY_ACCOMMODATIVE, Reason.of("pattern.held-with-plus"));
            }
            List<Effect> known =
                    breaking().map(this::effect).flatMap(Optional::stream).toList();
            Optional<Effect> real = known.stream().filter(Effect::isReal).findFirst();
            if (real.isPresent()) {
                return because(PatternKind.PARTLY_ACCOMMODATIVE, real.get().worded("pattern.plus-lowers"));
            }
            return known.isEmpty()
                    ? undetermined(judgedAt, Reason.of("pattern.no-uncorrected-turn"))
                    : because(PatternKind.NON_ACCOMMODATIVE, known.get(0).worded("pattern.plus-does-not-lower"));
        }

        /** What plus did where the turn breaks; empty when it was not measured there without glasses. */
        private Optional<Effect> effect(TurnCondition corrected) {
            TurnCondition bare =
                    corrected == TurnCondition.CC_DISTANCE ? TurnCondition.SC_DISTANCE : TurnCondition.SC_NEAR;
            PrismDioptres without = turns.signedAt(bare);
            PrismDioptres with = turns.signedAt(corrected);
            return without == null || with == null
                    ? Optional.empty()
                    : Optional.of(new Effect(corrected, without, with));
        }

        private Stream<TurnCondition> breaking() {
            return Stream.of(TurnCondition.CC_DISTANCE, Control.nearAsJudged(visit))
                    .filter(this::breaks);
        }

        private boolean breaks(TurnCondition condition) {
            return Control.breaks(turns.horizontalAt(condition), limits);
        }

        private Pattern because(PatternKind kind, Reason reason) {
            return Settling.at(visit, limits) == Settling.UNKNOWN
                    ? new Pattern(kind, List.of(judgedAt, reason, Reason.of("pattern.worn-since-unknown")))
                    : new Pattern(kind, List.of(judgedAt, reason));
        }
    }

    /** The turn under a condition with plus, and at the same distance without. */
    private record Effect(TurnCondition condition, PrismDioptres without, PrismDioptres with) {

        boolean isReal() {
            return Repeatability.isRealRise(with, without);
        }

        Reason worded(String key) {
            return Reason.of(
                    key, without, with, Repeatability.realFrom(without, with), Reason.of(Control.key(condition)));
        }
    }
}
