package plusward.visit;

import jakarta.persistence.Embeddable;
import jakarta.persistence.Embedded;
import jakarta.persistence.EnumType;
import jakarta.persistence.Enumerated;
import org.hibernate.annotations.EmbeddedColumnNaming;
import org.jspecify.annotations.Nullable;
import plusward.exam.Eye;
import plusward.exam.HorizontalTurn;
import plusward.exam.Phase;
import plusward.exam.PrismReading;
import plusward.exam.Turn;
import plusward.exam.VerticalTurn;
import plusward.optics.PrismDioptres;

/** The columns of a turn: a horizontal and a vertical part, each with one prism or one before each eye. */
@Embeddable
record StoredTurn(
        @Embedded @EmbeddedColumnNaming("%s") @Nullable Horizontal horizontal,

        @Embedded @EmbeddedColumnNaming("vertical_%s") @Nullable
        Vertical vertical) {

    @Embeddable
    record Horizontal(
            @Enumerated(EnumType.STRING) HorizontalTurn.Direction direction,
            @Enumerated(EnumType.STRING) Phase phase,
            double prismPd,
            @Nullable Double otherPrismPd) {}

    @Embeddable
    record Vertical(
            @Enumerated(EnumType.STRING) Eye higher,
            @Enumerated(EnumType.STRING) Phase phase,
            double prismPd,
            @Nullable Double otherPrismPd) {}

    static @Nullable StoredTurn of(@Nullable Turn turn) {
        return turn == null ? null : new StoredTurn(horizontal(turn.horizontal()), vertical(turn.vertical()));
    }

    static @Nullable Turn turn(@Nullable StoredTurn stored) {
        return stored == null ? null : new Turn(turn(stored.horizontal), turn(stored.vertical));
    }

    private static @Nullable Horizontal horizontal(@Nullable HorizontalTurn turn) {
        return turn == null
                ? null
                : new Horizontal(
                        turn.direction(), turn.phase(), turn.prism().one().amount(), other(turn.prism()));
    }

    private static @Nullable Vertical vertical(@Nullable VerticalTurn turn) {
        return turn == null
                ? null
                : new Vertical(turn.higher(), turn.phase(), turn.prism().one().amount(), other(turn.prism()));
    }

    private static @Nullable HorizontalTurn turn(@Nullable Horizontal stored) {
        return stored == null
                ? null
                : new HorizontalTurn(stored.direction, stored.phase, prism(stored.prismPd, stored.otherPrismPd));
    }

    private static @Nullable VerticalTurn turn(@Nullable Vertical stored) {
        return stored == null
                ? null
                : new VerticalTurn(stored.higher, stored.phase, prism(stored.prismPd, stored.otherPrismPd));
    }

    private static @Nullable Double other(PrismReading prism) {
        PrismDioptres other = prism.other();
        return other == null ? null : other.amount();
    }

    private static PrismReading prism(double one, @Nullable Double other) {
        return new PrismReading(PrismDioptres.of(one), other == null ? null : PrismDioptres.of(other));
    }
}
