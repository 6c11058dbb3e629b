package plusward.rules;

import java.util.ArrayList;
import java.util.List;
import plusward.exam.Reason;
import plusward.optics.Axis;
import plusward.optics.Degrees;
import plusward.optics.Dioptres;
import plusward.optics.Lens;
import plusward.optics.Millimetres;
import plusward.optics.Quantity;

/**
 * How far a made lens may be off the order: the tolerances of ANSI Z80.1 (2010 and 2015, from summaries).
 *
 * <p>The two principal meridians, larger with larger and smaller with smaller: ±0.13 D to 6.50 D, beyond that ±2 %. Cylinder:
 * ±0.13 D to 2.00, ±0.15 D to 4.50, beyond that ±4 %. Axis: ±14° to 0.25 D of cylinder, ±7° to 0.50, ±5° to 0.75, ±3° to
 * 1.50, ±2° above. Add: ±0.12 D to 4.00, ±0.18 D above. Segment heights of a pair: 1.0 mm apart. The power of the order decides which tolerance holds; the cylinder
 * form does not matter. Worked examples: +5.00 read +5.12 passes and +5.14 fails; a 1.00 D cylinder 3° off passes, 4° fails.
 */
final class AnsiZ801 {

    /** How far the segment heights of a pair may differ: 1.0 mm. */
    static final Millimetres SEGMENTS_APART = Millimetres.of(1.0);

    private AnsiZ801() {}

    /** Everything in which the made lens is off the order; empty when it is within tolerance. */
    static List<Reason> faults(Lens ordered, Lens made) {
        Lens order = ordered.inMinusCylinder();
        Lens lens = made.inMinusCylinder();
        List<Reason> faults = new ArrayList<>();
        compare("meridian-larger", order.sphere(), lens.sphere(), meridian(order.sphere()), faults);
        compare("meridian-smaller", smaller(order), smaller(lens), meridian(smaller(order)), faults);
        Dioptres ofOrder = order.cylinder().size();
        Dioptres ofLens = lens.cylinder().size();
        Limit<Dioptres> allowed = Limit.atMost(cylinder(ofOrder));
        compare("cylinder", ofLens.minus(ofOrder).size(), allowed, new Size(ofOrder), new Size(ofLens), faults);
        axisFault(order, lens, faults);
        return faults;
    }

    /** True when the add read is further from the order than allowed. */
    static boolean isAddOff(Dioptres ordered, Dioptres made) {
        return Limit.atMost(add(ordered)).isCrossedBy(made.minus(ordered).size());
    }

    static Dioptres meridian(Dioptres ordered) {
        return ordered.size().isOver(Dioptres.of(6.50)) ? ordered.size().times(0.02) : Dioptres.of(0.13);
    }

    static Dioptres cylinder(Dioptres ordered) {
        if (ordered.size().isOver(Dioptres.of(4.50))) {
            return ordered.size().times(0.04);
        }
        return Dioptres.of(ordered.size().isOver(Dioptres.of(2.00)) ? 0.15 : 0.13);
    }

    static Dioptres add(Dioptres ordered) {
        return Dioptres.of(ordered.isOver(Dioptres.of(4.00)) ? 0.18 : 0.12);
    }

    static Degrees axis(Dioptres orderedCylinder) {
        double power = orderedCylinder.size().inDioptres();
        if (power <= 0.50) {
            return Degrees.of(power <= 0.25 ? 14 : 7);
        }
        if (power <= 0.75) {
            return Degrees.of(5);
        }
        return Degrees.of(power <= 1.50 ? 3 : 2);
    }

    private static Dioptres smaller(Lens minusCylinder) {
        return minusCylinder.sphere().plus(minusCylinder.cylinder());
    }

    private static void axisFault(Lens order, Lens lens, List<Reason> faults) {
        boolean bothToric = order.cylinder().amount() != 0 && lens.cylinder().amount() != 0;
        if (bothToric) {
            Degrees off = between(order.axis(), lens.axis());
            compare("axis", off, Limit.atMost(axis(order.cylinder())), order.axis(), lens.axis(), faults);
        }
    }

    /** The smaller angle between two axes: 178 and 2 are 4° apart. */
    static Degrees between(Axis one, Axis other) {
        int apart = Math.abs(one.inDegrees() - other.inDegrees());
        return Degrees.of(Math.min(apart, 180 - apart));
    }

    private static void compare(String what, Dioptres ordered, Dioptres made, Dioptres tolerance, List<Reason> faults) {
        compare(what, made.minus(ordered).size(), Limit.atMost(tolerance), ordered, made, faults);
    }

    private static <Q extends Quantity<Q>> void compare(
            String what, Q off, Limit<Q> limit, Object ordered, Object made, List<Reason> faults) {
        if (limit.isCrossedBy(off)) {
            faults.add(Reason.of("lens-fault." + what, ordered, made, new Size(off), limit));
        }
    }
}
