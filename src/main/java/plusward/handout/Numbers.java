package plusward.handout;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import plusward.course.Control;
import plusward.course.Worn;
import plusward.exam.HorizontalTurn;
import plusward.exam.PerEye;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.optics.Dioptres;

/** The exact numbers behind the words, in the trade's notation, for any eye doctor who sees the child. */
final class Numbers {

    private final List<Entry> entries = new ArrayList<>();
    private final SheetFacts facts;

    private Numbers(SheetFacts facts) {
        this.facts = facts;
    }

    /** A number and what it is called. */
    record Entry(Reason label, Reason value) {}

    static List<Entry> of(SheetFacts facts) {
        return new Numbers(facts).entries();
    }

    private List<Entry> entries() {
        add(
                "cycloplegic",
                eyes(facts.cycloplegic().equivalent()),
                Phrases.date(facts.cycloplegic().takenOn()));
        lenses();
        turn("far", TurnCondition.SC_DISTANCE, TurnCondition.CC_DISTANCE);
        turn("near", TurnCondition.SC_NEAR, TurnCondition.CC_NEAR);
        if (Control.nearAsJudged(facts.visit()) == TurnCondition.ADD_NEAR) {
            add("near-add", turn(TurnCondition.ADD_NEAR));
        }
        chart();
        focusing();
        return entries;
    }

    private void lenses() {
        add("worn", eyes(Worn.equivalent(facts.visit().glasses())));
        if (facts.visit().glasses().haveAdd()) {
            add("worn-add", shown(facts.visit().glasses().asOrdered().addOrZero()));
        }
        Lenses lenses = facts.lenses();
        if (lenses.areNew()) {
            add("new", eyes(lenses.equivalent()));
            if (lenses.haveAdd()) {
                add("new-add", shown(lenses.add()));
            }
        }
    }

    private void turn(String name, TurnCondition without, TurnCondition with) {
        add(name, Reason.of("handout.number.without-with", turn(without), turn(with)));
    }

    private void chart() {
        boolean with = !Sight.read(facts.visit()).isEmpty()
                && Sight.read(facts.visit()).equals(Sight.withGlasses(facts.visit()));
        add(with ? "chart" : "chart-without", eyes(Sight.read(facts.visit())));
    }

    private void focusing() {
        Focusing focusing = facts.focusing();
        Reason need = Reason.of("handout.number.dioptres", plain(focusing.need()));
        add(
                "focusing",
                focusing.amplitude()
                        .map(power -> Reason.of(
                                "handout.number.share",
                                need,
                                plain(power),
                                Math.round(100 * focusing.share().orElseThrow())))
                        .orElse(need));
    }

    private void add(String name, Reason value, Object... inLabel) {
        entries.add(new Entry(Reason.of("handout.number." + name, inLabel), value));
    }

    private Reason turn(TurnCondition condition) {
        HorizontalTurn turn = facts.turn(condition);
        return turn == null ? absent() : Reason.of("handout.number.turn", turn.toString());
    }

    private static Reason eyes(PerEye<?> eyes) {
        return Reason.of("handout.number.eyes", shown(eyes.right()), shown(eyes.left()));
    }

    private static Reason shown(@Nullable Object value) {
        return value == null ? absent() : Reason.of("handout.number.value", value);
    }

    private static Reason absent() {
        return Reason.of("handout.number.absent");
    }

    /** Without its sign, as an amount of focusing has none: {@code 4.13}. */
    private static String plain(Dioptres amount) {
        return amount.toString().replace("+", "");
    }
}
