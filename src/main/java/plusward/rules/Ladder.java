package plusward.rules;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.course.Control;
import plusward.course.Limits;
import plusward.course.Settling;
import plusward.course.TurnChange;
import plusward.course.Visit;
import plusward.exam.HorizontalTurn;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;

/**
 * What to rule out, in order, when the turn is not held: each line ruled in or out by the child's own record.
 *
 * <p>Worn long enough each day; lenses made as ordered; these glasses worn long enough to settle; plus as strong as the latest
 * cycloplegic refraction; that refraction recent, and trusted; at near, an add present, its segment at the pupil, and near
 * measured through it; the change real; signs that ask for urgent examination; what is left, the doctor weighs. Where a rule
 * of the book answers a line, its answer is the line and is not worked out again.
 */
public final class Ladder {

    private final Situation situation;
    private final List<Step> steps = new ArrayList<>();

    private Ladder(Situation situation) {
        this.situation = situation;
    }

    /** What a line says of the record. */
    public enum Answer {
        /** The record speaks against this cause. */
        RULED_OUT,
        /** The record points to this cause. */
        FOUND,
        /** The record does not tell. */
        UNKNOWN,
        /** Nothing on record can answer it: to be asked, looked for, or weighed. */
        OPEN
    }

    /** One line of the ladder. */
    public record Step(Answer answer, Reason because) {

        /** The word for the answer. */
        public Reason verdict() {
            return Reason.of("ladder.answer."
                    + switch (answer) {
                        case RULED_OUT -> "ruled-out";
                        case FOUND -> "found";
                        case UNKNOWN -> "unknown";
                        case OPEN -> "open";
                    });
        }
    }

    /** The lines for a visit, in order. They are meant for a visit at which the turn is not held. */
    public static List<Step> at(Visit visit, LocalDate on, Limits limits) {
        return new Ladder(Situation.of(visit, on, limits)).climb();
    }

    /** The lines as sentences: the answer, then why. */
    static List<Reason> reasons(Situation situation) {
        return new Ladder(situation)
                .climb().stream()
                        .map(step -> Reason.of("ladder.line", step.verdict(), step.because()))
                        .toList();
    }

    private List<Step> climb() {
        rule(new WearShort());
        rule(new LensesOffOrder());
        settled();
        rule(new PlusShort());
        rule(new CycloplegicDue());
        trusted();
        near();
        breaking().forEach(this::change);
        urgent();
        add(Answer.OPEN, "ladder.doctor-weighs");
        return steps;
    }

    private void rule(Rule rule) {
        add(rule.judge(situation));
    }

    private void add(Finding finding) {
        Answer answer = finding instanceof Finding.Met
                ? Answer.FOUND
                : finding instanceof Finding.NotMet ? Answer.RULED_OUT : Answer.UNKNOWN;
        steps.add(new Step(answer, finding.because()));
    }

    /** The latest refraction is judged on its own day; where there is none, the line before has said so. */
    private void trusted() {
        situation
                .visit()
                .upToHere()
                .filter(visit -> !visit.exam().cycloplegic().isEmpty())
                .findFirst()
                .map(visit -> Situation.of(visit, situation.on(), situation.limits()))
                .map(new CycloplegiaDoubtful()::judge)
                .ifPresent(this::add);
    }

    private void settled() {
        LocalDate since = situation.visit().glasses().since();
        int weeks = situation.limits().settleWeeks();
        switch (Settling.at(situation.visit(), situation.limits())) {
            case SETTLED -> add(Answer.RULED_OUT, "ladder.settled", String.valueOf(since), weeks);
            case TOO_SOON -> add(Answer.FOUND, "ladder.too-soon", String.valueOf(since), weeks);
            case UNKNOWN -> add(Answer.UNKNOWN, "ladder.since-unknown", weeks);
        }
    }

    /** Only where near is not held, or not known: is there an add, does it sit at the pupil, was near measured through it? */
    private void near() {
        Visit visit = situation.visit();
        boolean unknown = reading(Control.nearAsJudged(visit)) == null;
        if (!visit.glasses().haveAdd()) {
            if (breaks(TurnCondition.CC_NEAR)) {
                add(Answer.FOUND, "ladder.no-add");
            }
        } else if (unknown || breaks(TurnCondition.ADD_NEAR)) {
            segment();
            add(
                    unknown ? Answer.UNKNOWN : Answer.RULED_OUT,
                    unknown ? "ladder.not-measured-through-add" : "ladder.measured-through-add");
        }
    }

    /** A lens without a line cannot be ruled out by the rule about the line. */
    private void segment() {
        Finding finding = new SegmentBelowPupil().judge(situation);
        if (situation.visit().exam().segment().hasLine()) {
            add(finding);
        } else {
            steps.add(new Step(Answer.UNKNOWN, finding.because()));
        }
    }

    /** Noise is ruled out by a real change, and also when the earlier reading was over the limit itself. */
    private void change(TurnCondition condition) {
        TurnChange.at(situation.visit(), condition)
                .ifPresentOrElse(
                        this::change,
                        () -> add(Answer.UNKNOWN, "ladder.no-earlier-reading", Reason.of(Control.key(condition))));
    }

    private void change(TurnChange change) {
        boolean overBefore = change.before().isOver(situation.limits().turn());
        String key = change.isReal() ? "ladder.real" : overBefore ? "ladder.over-before" : "ladder.noise";
        add(
                change.isReal() || overBefore ? Answer.RULED_OUT : Answer.FOUND,
                key,
                Reason.of(Control.key(change.condition())),
                change.before(),
                change.after(),
                change.since());
    }

    private void urgent() {
        Finding sudden = new SuddenLargerTurn().judge(situation);
        if (sudden instanceof Finding.Met) {
            add(sudden);
        }
        add(Answer.OPEN, "ladder.urgent-signs");
    }

    private Stream<TurnCondition> breaking() {
        return Stream.of(TurnCondition.CC_DISTANCE, Control.nearAsJudged(situation.visit()))
                .filter(this::breaks);
    }

    private boolean breaks(TurnCondition condition) {
        return Control.breaks(reading(condition), situation.limits());
    }

    private @Nullable HorizontalTurn reading(TurnCondition condition) {
        return situation.visit().exam().turns().horizontalAt(condition);
    }

    private void add(Answer answer, String key, Object... values) {
        steps.add(new Step(answer, Reason.of(key, values)));
    }
}
