package plusward.rules;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import plusward.course.Course;
import plusward.course.CourseText;
import plusward.course.Limits;
import plusward.course.Visit;

/** Lets one rule judge a visit that is written as text. */
final class Judged {

    /** The day of birth of a child whose age does not matter. */
    static final String BORN = "2019-05-02";

    private Judged() {}

    /** A visit of its own, on {@link CourseText#DAY}; each entry is {@code column=text}. */
    static Finding by(Rule rule, String... entries) {
        return by(rule, CourseText.visit(entries));
    }

    /** The latest visit of a table. */
    static Finding latest(Rule rule, String table) {
        return latest(rule, CourseText.course(BORN, table));
    }

    static Finding latest(Rule rule, Course course) {
        return by(rule, course.latest().orElseThrow());
    }

    /** On the day of the visit, with the usual limits. */
    static Finding by(Rule rule, Visit visit) {
        return by(rule, visit, visit.date(), Limits.DEFAULT);
    }

    static Finding by(Rule rule, Visit visit, LocalDate on, Limits limits) {
        return rule.judge(Situation.of(visit, on, limits));
    }

    /** An entry of a visit; a cell that a row leaves empty is not measured. */
    static String cell(String column, @Nullable String text) {
        return column + "=" + (text == null ? "" : text);
    }
}
