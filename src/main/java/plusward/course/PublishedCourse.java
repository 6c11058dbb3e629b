package plusward.course;

import java.util.ArrayList;
import java.util.List;
import plusward.optics.Age;
import plusward.optics.Dioptres;

/**
 * How hyperopia ran in published series of children with accommodative esotropia, to stand beside a child's own.
 *
 * <p>From 3 to 7 years +0.12 D a year when it began under +4.00 D, else 0.0; from 7 to 15 years −0.17 to −0.18 D a year
 * (Bonafede et al., Br J Ophthalmol 2020;104:1283, n = 405). After 7 years −0.24 D a year in another (Black 2006). The band
 * lies between the two; before 3 and after 15 years there is none. Worked example: +3.00 at 5 years is +3.24 at 7 and from
 * +2.52 to +2.73 at 10.
 */
public final class PublishedCourse {

    private static final Dioptres MODERATE = Dioptres.of(4);
    private static final Age FROM = Age.of(3);
    private static final Age TURNING = Age.of(7);
    private static final Age TO = Age.of(15);
    private static final double EARLY_MODERATE = 0.12;
    private static final double EARLY_HIGH = 0.0;
    private static final double LATE_SLOWER = -0.17;
    private static final double LATE_FASTER = -0.24;

    private PublishedCourse() {}

    /** A point of the band: between low and high in dioptres at an age. */
    public record Point(Age age, Dioptres low, Dioptres high) {}

    /** The band from a child's first refraction to an age; fewer than two points when none of it lies from 3 to 15 years. */
    public static List<Point> from(Age first, Dioptres hyperopia, Age until) {
        Age start = later(first, FROM);
        Age end = earlier(until, TO);
        List<Point> band = new ArrayList<>();
        if (!start.isUnder(end)) {
            return band;
        }
        band.add(new Point(start, hyperopia, hyperopia));
        double early = hyperopia.isUnder(MODERATE) ? EARLY_MODERATE : EARLY_HIGH;
        Age turn = earlier(later(start, TURNING), end);
        Dioptres atTurn = hyperopia.plus(Dioptres.of(early * turn.minus(start).inYears()));
        if (start.isUnder(turn)) {
            band.add(new Point(turn, atTurn, atTurn));
        }
        if (turn.isUnder(end)) {
            double years = end.minus(turn).inYears();
            band.add(new Point(
                    end, atTurn.plus(Dioptres.of(LATE_FASTER * years)), atTurn.plus(Dioptres.of(LATE_SLOWER * years))));
        }
        return band;
    }

    private static Age later(Age one, Age other) {
        return one.isOver(other) ? one : other;
    }

    private static Age earlier(Age one, Age other) {
        return one.isUnder(other) ? one : other;
    }
}
