package plusward.readback;

import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;
import plusward.course.TurnChange;
import plusward.course.Visit;
import plusward.exam.Eye;
import plusward.exam.HorizontalTurn;
import plusward.exam.Phase;
import plusward.exam.Reason;
import plusward.exam.Turn;
import plusward.exam.TurnCondition;
import plusward.exam.VerticalTurn;
import plusward.optics.PrismDioptres;

/** A turn read back: which way, how often it shows, how many Δ in all, and the change since the last comparable reading. */
final class TurnReads {

    /** A smaller difference would read as 0 Δ: {@code ET 30+25} is 59.46 Δ. */
    private static final PrismDioptres SHOWN = PrismDioptres.of(0.05);

    private TurnReads() {}

    static Stream<Reason> of(Visit visit, TurnCondition condition) {
        return Optional.ofNullable(visit.exam().turns().at(condition)).stream()
                .flatMap(turn -> Stream.concat(
                        understood(turn), TurnChange.at(visit, condition).map(TurnReads::change).stream()));
    }

    /** Which way, how often, how much; horizontal and vertical. */
    static Stream<Reason> understood(Turn turn) {
        return Stream.concat(
                Optional.ofNullable(turn.horizontal()).map(TurnReads::horizontal).stream(),
                Optional.ofNullable(turn.vertical()).map(TurnReads::vertical).stream());
    }

    private static Reason horizontal(HorizontalTurn turn) {
        if (turn.isOrtho()) {
            return Reason.of("readback.turn.ortho");
        }
        String way = turn.direction() == HorizontalTurn.Direction.INWARD ? "inward" : "outward";
        return Reason.of(
                "readback.turn." + way, shows(turn.phase()), turn.prism().total());
    }

    private static Reason vertical(VerticalTurn turn) {
        String higher = turn.higher() == Eye.RIGHT ? "right" : "left";
        return Reason.of(
                "readback.turn." + higher + "-higher",
                shows(turn.phase()),
                turn.prism().total());
    }

    private static Reason shows(Phase phase) {
        return Reason.of("readback.turn.shows." + phase.name().toLowerCase(Locale.ROOT));
    }

    private static Reason change(TurnChange change) {
        double amount = change.amount().amount();
        if (change.amount().size().isUnder(SHOWN)) {
            boolean straight = change.after().amount() == 0;
            return Reason.of(straight ? "readback.same" : "readback.turn.same", change.since());
        }
        String way = amount > 0 ? "in" : "out";
        return Reason.of(
                "readback.turn." + (change.isReal() ? "real-" : "noise-") + way,
                change.amount().size(),
                change.since());
    }
}
