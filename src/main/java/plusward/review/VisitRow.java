package plusward.review;

import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;
import plusward.course.Control;
import plusward.course.ControlState;
import plusward.course.Derived;
import plusward.course.Limits;
import plusward.course.TurnChange;
import plusward.course.Visit;
import plusward.exam.Examination;
import plusward.exam.Reason;
import plusward.exam.Turn;
import plusward.exam.TurnCondition;
import plusward.rules.Finding;
import plusward.rules.Rulebook;
import plusward.rules.Weight;

/** One line of the visit table. */
record VisitRow(
        long id, Visit visit, ControlState state, Derived derived, List<TurnCell> turns, List<Finding.Met> flags) {

    private static final List<TurnCondition> COLUMNS = List.of(
            TurnCondition.SC_DISTANCE,
            TurnCondition.SC_NEAR,
            TurnCondition.CC_DISTANCE,
            TurnCondition.CC_NEAR,
            TurnCondition.ADD_NEAR);

    /** A turn as written, and what became of it since the last comparable reading. */
    record TurnCell(
            @Nullable Turn turn, boolean breaks, @Nullable Reason change) {}

    static VisitRow of(long id, Visit visit, LocalDate on, Limits limits) {
        return new VisitRow(
                id,
                visit,
                Control.at(visit, limits).state(),
                Derived.at(visit),
                COLUMNS.stream()
                        .map(condition -> cell(visit, condition, limits))
                        .toList(),
                Rulebook.met(visit, on, limits).stream()
                        .filter(finding -> finding.weight() != Weight.NOTE)
                        .toList());
    }

    private static TurnCell cell(Visit visit, TurnCondition condition, Limits limits) {
        Turn turn = visit.exam().turns().at(condition);
        boolean breaks =
                condition.isCorrected() && Control.breaks(visit.exam().turns().horizontalAt(condition), limits);
        return new TurnCell(
                turn,
                breaks,
                TurnChange.at(visit, condition).map(VisitRow::worded).orElse(null));
    }

    private static Reason worded(TurnChange change) {
        if (change.amount().amount() == 0) {
            return Reason.of("review.change.none");
        }
        String direction = change.amount().amount() > 0 ? "inward" : "outward";
        String key = "review.change." + (change.isReal() ? "real" : "noise") + "." + direction;
        return Reason.of(key, change.amount().size());
    }

    public Examination exam() {
        return visit.exam();
    }
}
