package plusward.exam;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;

/**
 * How far each eye moves by itself: normal, or what is limited.
 *
 * <p>Nothing limited in either eye is a finding, written {@code normal}; ductions that were not looked at are absent as a
 * whole. By how much a movement is limited is not recorded. Otherwise written as a list, the right eye first, each eye in
 * the order of {@link Duction}: {@code right abduction, left elevation}.
 *
 * @param right what is limited in the right eye; empty: nothing
 * @param left what is limited in the left eye; empty: nothing
 */
public record Ductions(Set<Duction> right, Set<Duction> left) {

    /** Looked at, and nothing is limited. */
    public static final Ductions NORMAL = new Ductions(Set.of(), Set.of());

    /** The word for it, in tables and on the page. */
    static final String NORMAL_WORD = "normal";

    public Ductions {
        right = inOrder(right);
        left = inOrder(left);
    }

    /**
     * Reads {@code normal}, or what is limited with a comma or a semicolon between, in any case and order; the eye may be
     * written {@code R}, {@code L}, {@code OD} or {@code OS}. The same movement twice counts once.
     *
     * @throws NotationException when it is neither: {@code unreadable}, {@code long}
     */
    public static Ductions parse(String text) {
        return DuctionsNotation.parse(text);
    }

    /** True when no movement of either eye is limited. */
    public boolean areNormal() {
        return right.isEmpty() && left.isEmpty();
    }

    /** What is limited in this eye; empty: nothing. */
    public Set<Duction> of(Eye eye) {
        return eye == Eye.RIGHT ? right : left;
    }

    /** As the mirror shows them: right and left change places; toward the nose stays toward the nose. */
    public Ductions swapped() {
        return new Ductions(left, right);
    }

    private static Set<Duction> inOrder(Set<Duction> limited) {
        Set<Duction> inOrder = EnumSet.noneOf(Duction.class);
        inOrder.addAll(limited);
        return Collections.unmodifiableSet(inOrder);
    }

    /** The notation that {@link #parse} reads. */
    @Override
    public String toString() {
        if (areNormal()) {
            return NORMAL_WORD;
        }
        List<String> limited = new ArrayList<>();
        right.forEach(duction -> limited.add("right " + duction));
        left.forEach(duction -> limited.add("left " + duction));
        return String.join(", ", limited);
    }
}
