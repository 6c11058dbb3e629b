package plusward.rules;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import plusward.exam.PerEye;
import plusward.optics.Quantity;

/** Gathers the numbers behind a finding, in the order in which they are added; what is missing is left out. */
final class Evidence {

    private final Map<String, Object> values = new LinkedHashMap<>();

    private Evidence() {}

    static Evidence none() {
        return new Evidence();
    }

    static Evidence of(String name, @Nullable Object value) {
        return new Evidence().and(name, value);
    }

    Evidence and(String name, @Nullable Object value) {
        if (value != null) {
            values.put(name, value);
        }
        return this;
    }

    <Q extends Quantity<Q>> Evidence andEyes(PerEye<Q> eyes) {
        return and("right", eyes.right()).and("left", eyes.left());
    }

    /** The eyes as they were written down, where not all can be counted. */
    Evidence written(PerEye<?> eyes) {
        PerEye<String> text = eyes.map(Object::toString);
        return and("right", text.right()).and("left", text.left());
    }

    /** A pair of eyes beside another pair: {@code wornRight}, {@code wornLeft}. */
    <Q extends Quantity<Q>> Evidence andEyes(String what, PerEye<Q> eyes) {
        return and(what + "Right", eyes.right()).and(what + "Left", eyes.left());
    }

    Evidence limit(Limit<?> limit) {
        return and("limit", limit.bound());
    }

    Map<String, Object> values() {
        return Collections.unmodifiableMap(values);
    }
}
