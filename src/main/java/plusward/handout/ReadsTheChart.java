package plusward.handout;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import plusward.exam.Acuity;
import plusward.exam.Eye;
import plusward.exam.PerEye;
import plusward.exam.Reason;

/** What the chart shows of this child, and what no chart shows. */
final class ReadsTheChart implements Paragraph {

    @Override
    public List<Reason> say(SheetFacts facts) {
        List<Reason> said = new ArrayList<>();
        Sight sight = Sight.of(facts);
        said.add(facts.sentence("chart." + sight.name().toLowerCase(Locale.ROOT).replace('_', '-')));
        if (facts.found("acuity-gap")) {
            said.addAll(weakerEye(facts));
        }
        said.add(facts.sentence(sight == Sight.LOW ? "chart.hides-too" : "chart.hides"));
        return said;
    }

    private static List<Reason> weakerEye(SheetFacts facts) {
        PerEye<Double> size = Sight.read(facts.visit()).map(ReadsTheChart::size);
        Double right = size.right();
        Double left = size.left();
        if (right == null || left == null || right.equals(left)) {
            return List.of();
        }
        Eye weaker = right > left ? Eye.RIGHT : Eye.LEFT;
        return List.of(facts.sentence("chart.gap", Phrases.side(weaker), Phrases.side(weaker.other())));
    }

    private static Double size(Acuity acuity) {
        return acuity.logMar().orElseThrow().amount();
    }
}
