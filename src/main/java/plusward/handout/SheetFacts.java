package plusward.handout;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import plusward.course.Control;
import plusward.course.CycloplegicInForce;
import plusward.course.Limits;
import plusward.course.Pattern;
import plusward.course.SegmentPlace;
import plusward.course.Visit;
import plusward.course.VisitModel;
import plusward.exam.HorizontalTurn;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.rules.Finding;
import plusward.rules.Rulebook;

/**
 * All that the paragraphs may look at, as of the child's latest visit.
 *
 * @param name how the sheet calls the child
 * @param today the day on which the sheet is printed
 * @param findings the answers of the rulebook at that visit
 */
record SheetFacts(
        Reason name,
        LocalDate today,
        Limits limits,
        Visit visit,
        CycloplegicInForce cycloplegic,
        Control control,
        Pattern pattern,
        VisitModel model,
        List<Finding> findings) {

    static SheetFacts of(Reason name, Visit visit, CycloplegicInForce cycloplegic, Limits limits, LocalDate today) {
        return new SheetFacts(
                name,
                today,
                limits,
                visit,
                cycloplegic,
                Control.at(visit, limits),
                Pattern.at(visit, limits),
                VisitModel.at(visit),
                Rulebook.judge(visit, today, limits));
    }

    /** A sentence about this child: the name is value 0, the others follow. */
    Reason sentence(String key, Object... values) {
        Object[] all = new Object[values.length + 1];
        all[0] = name;
        System.arraycopy(values, 0, all, 1, values.length);
        return Reason.of("handout." + key, all);
    }

    @Nullable
    HorizontalTurn turn(TurnCondition condition) {
        return visit.exam().turns().horizontalAt(condition);
    }

    Focusing focusing() {
        return new Focusing(cycloplegic, visit.age());
    }

    Lenses lenses() {
        return Lenses.after(visit);
    }

    /** Where the line of the glasses worn sits; empty when it was not measured or there is none. */
    Optional<SegmentPlace> line() {
        return SegmentPlace.at(visit, limits);
    }

    /** True when the rulebook raised this finding. */
    boolean found(String code) {
        return findings.stream()
                .anyMatch(each -> each instanceof Finding.Met && each.code().equals(code));
    }

    /** True when the rulebook could tell that this finding does not hold; false when it could not tell. */
    boolean ruledOut(String code) {
        return findings.stream()
                .anyMatch(each -> each instanceof Finding.NotMet && each.code().equals(code));
    }
}
