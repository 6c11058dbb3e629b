package plusward.exam;

import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;
import plusward.optics.Lens;

/** A measure that has a lens for each eye, with the two fields in which it is written. */
public enum LensMeasure {
    /** The glasses worn when the child came, as ordered. */
    WORN(Field.WORN_RIGHT, Field.WORN_LEFT, exam -> exam.glasses().asOrdered().lenses()),
    /** The lensmeter reading of those glasses. */
    MADE(Field.MADE_RIGHT, Field.MADE_LEFT, exam -> exam.made().lenses()),
    /** The refraction with focusing at rest. */
    CYCLOPLEGIC(
            Field.CYCLOPLEGIC_RIGHT,
            Field.CYCLOPLEGIC_LEFT,
            exam -> exam.cycloplegic().refraction()),
    /** The refraction without drops. */
    MANIFEST(Field.MANIFEST_RIGHT, Field.MANIFEST_LEFT, Examination::manifest),
    /** The lenses ordered at the visit. */
    ORDERED(Field.ORDERED_RIGHT, Field.ORDERED_LEFT, exam -> exam.ordered().lenses());

    private final Field right;
    private final Field left;

    @SuppressWarnings("ImmutableEnumChecker") // a method reference
    private final Function<Examination, PerEye<Lens>> lenses;

    LensMeasure(Field right, Field left, Function<Examination, PerEye<Lens>> lenses) {
        this.right = right;
        this.left = left;
        this.lenses = lenses;
    }

    /** The lenses of an examination; an eye that was not measured is missing. */
    public PerEye<Lens> in(Examination examination) {
        return lenses.apply(examination);
    }

    /** The lens of one eye; empty when it was not measured. */
    public Optional<Lens> in(Examination examination, Eye eye) {
        return Optional.ofNullable(in(examination).of(eye));
    }

    /** The field of one eye. */
    public Field field(Eye eye) {
        return eye == Eye.RIGHT ? right : left;
    }

    /** The measure that is written in a field; empty for a field that holds no lens. */
    public static Optional<LensMeasure> of(Field field) {
        return Stream.of(values())
                .filter(each -> each.right == field || each.left == field)
                .findFirst();
    }

    /** The eye of one of its fields. */
    public Eye eye(Field field) {
        return field == right ? Eye.RIGHT : Eye.LEFT;
    }
}
