package plusward.rules;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import plusward.course.Control;
import plusward.course.Limits;
import plusward.course.Settling;
import plusward.course.TurnChange;
import plusward.course.Visit;
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
        rule(new CycloplegiaDoubtful());
        near();
        change();
        add(Answer.OPEN, "ladder.urgent-signs");
        add(Answer.OPEN, "ladder.doctor-weighs");
        return steps;
    }

    private void rule(Rule rule) {
        Finding finding = rule.judge(situation);
        Answer answer = finding instanceof Finding.Met
                ? Answer.FOUND
                : finding instanceof Finding.NotMet ? Answer.RULED_OUT : Answer.UNKNOWN;
        steps.add(new Step(answer, finding.because()));
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

    /** Only where near is not held: is there an add, does it sit at the pupil, was near measured through it? */
    private void near() {
        Visit visit = situation.visit();
        if (!nearBreaks()) {
            return;
        }
        if (!visit.glasses().haveAdd()) {
            add(Answer.FOUND, "ladder.no-add");
            return;
        }
        rule(new SegmentBelowPupil());
        add(Answer.RULED_OUT, "ladder.measured-through-add");
    }

    private boolean nearBreaks() {
        TurnCondition near = Control.nearAsJudged(situation.visit());
        boolean throughAddUnknown = situation.visit().glasses().haveAdd()
                && situation.visit().exam().turns().horizontalAt(TurnCondition.ADD_NEAR) == null;
        if (throughAddUnknown) {
            add(Answer.UNKNOWN, "ladder.not-measured-through-add");
        }
        return Control.breaks(situation.visit().exam().turns().horizontalAt(near), situation.limits());
    }

    private void change() {
        TurnCondition condition = breaking();
        TurnChange.at(situation.visit(), condition)
                .ifPresentOrElse(
                        change -> add(
                                change.isReal() ? Answer.RULED_OUT : Answer.FOUND,
                                change.isReal() ? "ladder.real" : "ladder.noise",
                                Reason.of(Control.key(condition)),
                                change.before(),
                                change.after(),
                                change.since()),
                        () -> add(Answer.UNKNOWN, "ladder.no-earlier-reading", Reason.of(Control.key(condition))));
    }

    private TurnCondition breaking() {
        boolean distance = Control.breaks(
                situation.visit().exam().turns().horizontalAt(TurnCondition.CC_DISTANCE), situation.limits());
        return distance ? TurnCondition.CC_DISTANCE : Control.nearAsJudged(situation.visit());
    }

    private void add(Answer answer, String key, Object... values) {
        steps.add(new Step(answer, Reason.of(key, values)));
    }
}
