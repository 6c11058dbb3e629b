package plusward.handout;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import plusward.course.Control;
import plusward.course.Visit;
import plusward.exam.HorizontalTurn;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;

/** The turn as it was measured, without the glasses and with them; an older measurement says when it was made. */
final class TurnInNumbers implements Paragraph {

    @Override
    public List<Reason> say(SheetFacts facts) {
        List<Reason> said = new ArrayList<>();
        said.addAll(at(facts, TurnCondition.SC_DISTANCE, TurnCondition.CC_DISTANCE));
        said.addAll(at(facts, TurnCondition.SC_NEAR, Control.nearAsJudged(facts.visit())));
        said.add(0, facts.sentence(said.isEmpty() ? "turns.none" : "turns.how"));
        return said;
    }

    private static List<Reason> at(SheetFacts facts, TurnCondition without, TurnCondition with) {
        List<Reason> said = new ArrayList<>();
        Optional<Visit> measured = latest(facts.visit(), without);
        measured.ifPresent(visit -> said.add(withoutGlasses(facts, visit, without)));
        HorizontalTurn corrected = facts.turn(with);
        if (corrected != null) {
            boolean follows = measured.filter(Visit::isLatest).isPresent();
            said.add(follows ? thenWith(facts, with, corrected) : withGlasses(facts, with, corrected));
        }
        return said;
    }

    private static Reason withGlasses(SheetFacts facts, TurnCondition condition, HorizontalTurn turn) {
        return facts.sentence("turns.with", Phrases.where(condition), Phrases.turn(turn));
    }

    private static Reason thenWith(SheetFacts facts, TurnCondition condition, HorizontalTurn turn) {
        String key = condition == TurnCondition.ADD_NEAR ? "turns.then-with-add" : "turns.then-with";
        return facts.sentence(key, Phrases.turn(turn));
    }

    private static Reason withoutGlasses(SheetFacts facts, Visit visit, TurnCondition condition) {
        Reason turn = Phrases.turn(Objects.requireNonNull(visit.exam().turns().horizontalAt(condition)));
        return visit.isLatest()
                ? facts.sentence("turns.without", Phrases.where(condition), turn)
                : facts.sentence("turns.without-earlier", Phrases.where(condition), turn, Phrases.date(visit.date()));
    }

    private static Optional<Visit> latest(Visit visit, TurnCondition condition) {
        return visit.upToHere()
                .filter(each -> each.exam().turns().horizontalAt(condition) != null)
                .findFirst();
    }
}
