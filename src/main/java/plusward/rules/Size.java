package plusward.rules;

import plusward.exam.PerEye;
import plusward.optics.Degrees;
import plusward.optics.Quantity;

/**
 * An amount that has no direction, such as a pupil or a difference, written without a sign: {@code 4.5 mm},
 * {@code 4.0°}.
 *
 * @param quantity the amount, 0 or more
 */
record Size(Quantity<?> quantity) {

    static <Q extends Quantity<Q>> PerEye<Size> each(PerEye<Q> eyes) {
        return eyes.map(Size::new);
    }

    @Override
    public String toString() {
        String gap = quantity instanceof Degrees ? "" : " ";
        return quantity.toString().replaceFirst("^\\+", "") + gap + quantity.unit();
    }
}
