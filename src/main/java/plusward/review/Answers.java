package plusward.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import plusward.course.Control;
import plusward.course.ControlHistory;
import plusward.course.ControlState;
import plusward.course.Limits;
import plusward.course.Visit;
import plusward.exam.Reason;
import plusward.review.CoursePage.Answer;

/** The first line of the course: is the turn held with the glasses now, and since when. */
final class Answers {

    private Answers() {}

    static Answer at(Visit latest, Limits limits) {
        Control control = Control.at(latest, limits);
        ControlHistory history = ControlHistory.at(latest, limits);
        String tone = tone(control.state());
        return new Answer(
                tone,
                Reason.of("review.answer.word." + tone),
                sentence(latest, control, history),
                control.because(),
                history(latest, control, history, limits),
                latest.date());
    }

    private static String tone(ControlState state) {
        return switch (state) {
            case HELD, HELD_THROUGH_ADD -> "yes";
            case NOT_ASSESSABLE -> "unsure";
            case NOT_HELD_DISTANCE, NOT_HELD_NEAR, NOT_HELD_BOTH, TURNED_OUT -> "no";
        };
    }

    private static Reason sentence(Visit latest, Control control, ControlHistory history) {
        String key = "review.answer." + control.state().code();
        return control.state().isHeld() && history.heldSince() != null
                ? Reason.of(key, latest.date(), history.heldSince())
                : Reason.of(key, latest.date());
    }

    private static List<Reason> history(Visit latest, Control control, ControlHistory history, Limits limits) {
        List<Reason> sentences = new ArrayList<>();
        if (history.assessableVisits() > 0) {
            sentences.add(Reason.of(
                    "review.history.held", history.heldVisits(), history.assessableVisits(), history.longestRun()));
        }
        if (history.lostOn() != null && !control.state().isHeld()) {
            sentences.add(Reason.of("review.history.lost", history.lostOn()));
        }
        if (!control.state().isAssessable()) {
            lastAssessable(latest, limits)
                    .ifPresent(visit -> sentences.add(Reason.of(
                            "review.history.last-assessable",
                            visit.date(),
                            Reason.of("control.state."
                                    + Control.at(visit, limits).state().code()))));
        }
        return sentences;
    }

    private static Optional<Visit> lastAssessable(Visit latest, Limits limits) {
        return latest.lastBefore(visit -> Control.at(visit, limits).state().isAssessable());
    }
}
