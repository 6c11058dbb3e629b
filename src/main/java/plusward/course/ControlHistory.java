package plusward.course;

import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Held or not over the course, counting only visits at which it could be judged.
 *
 * @param heldSince first day of the unbroken run of held visits that reaches the latest; absent when it is not held now
 * @param heldVisits how many visits were held
 * @param assessableVisits how many could be judged
 * @param longestRun the most held visits in a row
 * @param lostOn the day of the latest visit found not held right after a held one; absent when that never happened
 */
public record ControlHistory(
        @Nullable LocalDate heldSince,
        int heldVisits,
        int assessableVisits,
        int longestRun,
        @Nullable LocalDate lostOn) {

    /** Looks at this visit and earlier ones. */
    public static ControlHistory at(Visit visit, Limits limits) {
        Walk walk = new Walk();
        for (Visit each : visit.fromFirst()) {
            walk.step(each.date(), Control.at(each, limits).state());
        }
        return new ControlHistory(walk.runSince, walk.held, walk.assessable, walk.longest, walk.lostOn);
    }

    /** Of all visits of a course; zero and absent while there is none. */
    public static ControlHistory of(Course course, Limits limits) {
        return course.latest().map(visit -> at(visit, limits)).orElse(new ControlHistory(null, 0, 0, 0, null));
    }

    private static final class Walk {

        private @Nullable LocalDate runSince;
        private @Nullable LocalDate lostOn;
        private int held;
        private int assessable;
        private int run;
        private int longest;

        void step(LocalDate day, ControlState state) {
            if (!state.isAssessable()) {
                return;
            }
            assessable++;
            if (state.isHeld()) {
                hold(day);
            } else {
                lostOn = run > 0 ? day : lostOn;
                run = 0;
                runSince = null;
            }
        }

        private void hold(LocalDate day) {
            runSince = run == 0 ? day : runSince;
            held++;
            run++;
            longest = Math.max(longest, run);
        }
    }

    /** The states in order, oldest first. */
    public static List<ControlState> states(Course course, Limits limits) {
        return course.visits().stream()
                .map(visit -> Control.at(visit, limits).state())
                .toList();
    }
}
