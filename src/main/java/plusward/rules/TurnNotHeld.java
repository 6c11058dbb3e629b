package plusward.rules;

import java.util.List;

/** With the glasses the turn is not held: a manifest or intermittent eso over the limit at distance, near or both. */
final class TurnNotHeld implements Rule {

    @Override
    public String code() {
        return "turn-not-held";
    }

    @Override
    public Source source() {
        return Source.JAAPOS_2014;
    }

    @Override
    public List<Weight> weights() {
        return List.of(Weight.ACT);
    }

    @Override
    public Finding judge(Situation situation) {
        if (!situation.state().isAssessable()) {
            return missing(Sentences.joined(situation.control().because()));
        }
        return situation.state().isNotHeld()
                ? met(
                        Weight.ACT,
                        ReadingEvidence.judged(situation),
                        Ladder.reasons(situation),
                        Sentences.joined(situation.control().because()))
                : not(Sentences.joined(situation.control().because()));
    }
}
