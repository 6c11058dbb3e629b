package plusward.rules;

import java.time.LocalDate;
import plusward.course.Control;
import plusward.course.ControlState;
import plusward.course.Limits;
import plusward.course.Visit;

/**
 * What a rule looks at: a visit with its past, the day on which it is judged, and the clinic's limits.
 *
 * @param visit the visit
 * @param on the day of the judgement; it matters only to an overdue visit
 * @param limits the clinic's limits
 * @param control whether the turn is held at this visit
 */
public record Situation(Visit visit, LocalDate on, Limits limits, Control control) {

    public static Situation of(Visit visit, LocalDate on, Limits limits) {
        return new Situation(visit, on, limits, Control.at(visit, limits));
    }

    ControlState state() {
        return control.state();
    }

    /** The weight of a rule that is heavier while the turn is not held. */
    Weight actWhenNotHeld() {
        return state().isNotHeld() ? Weight.ACT : Weight.LOOK;
    }
}
