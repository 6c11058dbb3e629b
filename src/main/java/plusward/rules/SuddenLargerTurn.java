package plusward.rules;

import java.util.List;
import java.util.Optional;

/** A turn that grew for no reason that glasses explain, began late with little hyperopia, or is larger at distance than near. */
final class SuddenLargerTurn implements SuddenTurn {

    private static final List<SuddenTurn> WAYS =
            List.of(new RiseInSameGlasses(), new LateOnset(), new DistanceExcess());

    /** The first that is met; else the first that cannot be told. */
    @Override
    public Finding judge(Situation situation) {
        List<Finding> findings = WAYS.stream().map(way -> way.judge(situation)).toList();
        return first(findings, Finding.Met.class)
                .or(() -> first(findings, Finding.Undecided.class))
                .orElseGet(this::not);
    }

    private static Optional<Finding> first(List<Finding> findings, Class<? extends Finding> answer) {
        return findings.stream().filter(answer::isInstance).findFirst();
    }
}
