package plusward.rules;

import java.util.List;
import java.util.stream.IntStream;
import plusward.exam.Reason;

/** One rule of the rulebook. It never throws for any visit. */
interface Rule {

    /** The name of its findings, as data and messages write it. */
    String code();

    /** Where it comes from. */
    Source source();

    /** The weights its findings may have, heaviest first. */
    List<Weight> weights();

    Finding judge(Situation situation);

    /** The condition holds; the sentence is {@code finding.<code>.met}. */
    default Finding.Met met(Weight weight, Evidence evidence, List<Reason> checkFirst, Object... values) {
        return new Finding.Met(code(), weight, sentence("met", values), evidence.values(), checkFirst, source());
    }

    /** The condition does not hold; the sentence is {@code finding.<code>.not}. */
    default Finding not(Object... values) {
        return new Finding.NotMet(code(), sentence("not", values));
    }

    /** The rule has nothing to say of such a visit, which is not a lack of data. */
    default Finding notApplicable(String why, Object... values) {
        return new Finding.NotMet(code(), Reason.of("finding.not-applicable." + why, values));
    }

    /** Something needed was not measured; the sentence is {@code finding.<code>.missing}. */
    default Finding missing(Object... values) {
        return new Finding.Undecided(code(), sentence("missing", values));
    }

    /** The first n check-first lines of this rule's messages. */
    default List<Reason> checks(int n) {
        return IntStream.rangeClosed(1, n).mapToObj(i -> sentence("check." + i)).toList();
    }

    private Reason sentence(String part, Object... values) {
        return Reason.of("finding." + code() + "." + part, values);
    }
}
