package plusward.rules;

import java.util.List;
import java.util.stream.Stream;
import plusward.exam.Eye;
import plusward.exam.LensPair;
import plusward.exam.Reason;
import plusward.optics.Dioptres;
import plusward.optics.Lens;

/** A lens or the add, read on the lensmeter, is outside ANSI Z80.1 of the order worn, in either cylinder form. */
final class LensesOffOrder implements Rule {

    @Override
    public String code() {
        return "lenses-off-order";
    }

    @Override
    public Source source() {
        return Source.ANSI_Z80_1;
    }

    @Override
    public List<Weight> weights() {
        return List.of(Weight.ACT, Weight.LOOK);
    }

    @Override
    public Finding judge(Situation situation) {
        LensPair order = situation.visit().glasses().asOrdered();
        LensPair made = situation.visit().exam().made();
        if (order.lenses().isEmpty()) {
            return notApplicable("no-glasses");
        }
        List<Reason> faults = Stream.of(
                        faults(Eye.RIGHT, order, made), faults(Eye.LEFT, order, made), addFaults(order, made))
                .flatMap(List::stream)
                .toList();
        if (faults.isEmpty()) {
            return isComplete(order, made) ? not() : missing();
        }
        return met(situation.actWhenNotHeld(), evidence(order, made), checks(2), Sentences.listed(faults));
    }

    /** An eye that lacks a lens or its reading has no faults to show; completeness is asked apart. */
    private static List<Reason> faults(Eye eye, LensPair order, LensPair made) {
        Lens ordered = order.lenses().of(eye);
        Lens read = made.lenses().of(eye);
        String named = eye == Eye.RIGHT ? "lens-fault.right" : "lens-fault.left";
        return ordered == null || read == null
                ? List.of()
                : AnsiZ801.faults(ordered, read).stream()
                        .map(fault -> Reason.of(named, fault))
                        .toList();
    }

    /** An add that was read and not ordered counts as one ordered with 0. */
    private static List<Reason> addFaults(LensPair order, LensPair made) {
        Dioptres ordered = order.addOrZero();
        Dioptres read = made.add();
        if (read == null || !AnsiZ801.isAddOff(ordered, read)) {
            return List.of();
        }
        return List.of(Reason.of("lens-fault.add", ordered, read, Limit.atMost(AnsiZ801.add(ordered))));
    }

    private static boolean isComplete(LensPair order, LensPair made) {
        return order.lenses().isComplete() && made.lenses().isComplete() && (!order.hasAdd() || made.add() != null);
    }

    private static Evidence evidence(LensPair order, LensPair made) {
        return Evidence.of("orderedRight", order.lenses().map(Lens::toString).right())
                .and("madeRight", made.lenses().map(Lens::toString).right())
                .and("orderedLeft", order.lenses().map(Lens::toString).left())
                .and("madeLeft", made.lenses().map(Lens::toString).left())
                .and("orderedAdd", order.add())
                .and("madeAdd", made.add());
    }
}
