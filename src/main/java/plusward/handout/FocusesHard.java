package plusward.handout;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import plusward.exam.Reason;

/** What it costs this child to see far away without glasses, in everyday terms. */
final class FocusesHard implements Paragraph {

    /** The largest share that each plain fraction stands for: halfway to the next one. */
    private static final TreeMap<Double, String> FRACTIONS = new TreeMap<>(Map.of(
            0.150,
            "tenth",
            0.225,
            "fifth",
            0.292,
            "quarter",
            0.417,
            "third",
            0.583,
            "half",
            0.708,
            "two-thirds",
            0.850,
            "three-quarters",
            1.0,
            "nearly-all"));

    @Override
    public List<Reason> say(SheetFacts facts) {
        Focusing focusing = facts.focusing();
        List<Reason> said = new ArrayList<>();
        said.add(facts.sentence("focus.far-sighted"));
        if (!facts.cycloplegic().equivalent().isComplete()) {
            said.add(facts.sentence("focus.one-eye", Phrases.side(focusing.strongerEye())));
        }
        if (focusing.isUnequal()) {
            said.add(facts.sentence("focus.unequal", Phrases.side(focusing.strongerEye())));
        }
        if (focusing.isWorthSaying()) {
            said.addAll(cost(facts, focusing));
        }
        return said;
    }

    private static List<Reason> cost(SheetFacts facts, Focusing focusing) {
        List<Reason> said = new ArrayList<>();
        String which = focusing.isUnequal() ? "focus.like-near-unequal" : "focus.like-near";
        said.add(facts.sentence(which, focusing.centimetres(), focusing.inches()));
        focusing.share().ifPresent(share -> said.add(share(facts, share)));
        return said;
    }

    private static Reason share(SheetFacts facts, double share) {
        Map.Entry<Double, String> fraction = FRACTIONS.ceilingEntry(share);
        return fraction == null
                ? facts.sentence("focus.more-than-all")
                : facts.sentence("focus.share", Reason.of("handout.fraction." + fraction.getValue()));
    }
}
