package plusward.course;

import plusward.exam.TurnCondition;
import plusward.exam.Viewing;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;

/**
 * A turn with the focusing that was needed while it was measured.
 *
 * @param accommodation dioptres, never below 0
 * @param turn inward positive
 */
public record FocusReading(TurnCondition condition, Dioptres accommodation, PrismDioptres turn) {

    public boolean isNear() {
        return condition.viewing() == Viewing.NEAR;
    }

    /** 1/sd² of this reading, in 1/Δ². */
    double weight() {
        double sd = Repeatability.standardDeviation(turn, condition.viewing()).amount();
        return 1 / (sd * sd);
    }
}
