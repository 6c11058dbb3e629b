package plusward.rules;

/** One rule of the rulebook. It never throws for any visit. */
interface Rule {

    /** The name of its findings, as data and messages write it. */
    String code();

    /** Where it comes from. */
    Source source();

    Finding judge(Situation situation);
}
