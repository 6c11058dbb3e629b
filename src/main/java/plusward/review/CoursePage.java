package plusward.review;

import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;
import plusward.child.ChildCard;
import plusward.course.FocusReading;
import plusward.exam.Reason;
import plusward.rules.Finding;
import plusward.rules.Ladder;

/**
 * What the Course page shows; sentences are still reasons, which the template words.
 *
 * @param overview what is said at the latest visit; absent while there is no visit
 */
record CoursePage(ChildCard child, @Nullable Overview overview, List<VisitRow> visits) {

    record Overview(
            Answer answer,
            List<Reason> pattern,
            List<Ladder.Step> ladder,
            List<Finding.Met> findings,
            List<Finding.Undecided> undecided,
            List<Reason> model,
            List<FocusReading> readings,
            List<Reason> trend,
            List<Reason> chart) {}

    /**
     * The first line of the page.
     *
     * @param tone {@code yes}, {@code no} or {@code unsure}: the colour, never alone
     * @param visit the day of the visit it is judged at
     */
    record Answer(
            String tone, Reason word, Reason sentence, List<Reason> because, List<Reason> history, LocalDate visit) {}
}
