package plusward.rules;

import plusward.exam.PerEye;
import plusward.exam.Reason;
import plusward.optics.Quantity;

/** Words a value of one or both eyes: "right +0.75 D, left +1.00 D", or the one that was measured. */
final class EyeValues {

    private EyeValues() {}

    static <Q extends Quantity<Q>> Reason of(PerEye<Q> eyes) {
        return worded(eyes);
    }

    /** The same of what is written rather than counted, such as an acuity. */
    static Reason written(PerEye<?> eyes) {
        return worded(eyes.map(Object::toString));
    }

    private static Reason worded(PerEye<?> eyes) {
        Object right = eyes.right();
        Object left = eyes.left();
        if (right != null && left != null) {
            return Reason.of("eyes.both", right, left);
        }
        if (right != null) {
            return Reason.of("eyes.right", right);
        }
        return left == null ? Reason.of("eyes.none") : Reason.of("eyes.left", left);
    }
}
