package plusward.handout;

import java.time.LocalDate;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import plusward.course.Course;
import plusward.course.CourseText;
import plusward.exam.Reason;
import plusward.web.Words;

/** Sheets for tests, written by the application's own words. */
final class Sheets {

    /** Full plus, worn all day, everything measured and held: a child of 5.87 years with hyperopia +4.00. */
    static final String[] HELD = {
        "worn_right=+4.00",
        "worn_left=+4.00",
        "worn_since=2024-09-01",
        "wear_hours=12",
        "cycloplegic_right=+4.00",
        "cycloplegic_left=+4.00",
        "turn_sc_distance=ET 30",
        "turn_sc_near=ET 35",
        "turn_cc_distance=E 4",
        "turn_cc_near=E 6",
        "acuity_right=20/25",
        "acuity_left=20/25",
        "next_visit_weeks=26"
    };

    private static final SheetWriter WRITER = new SheetWriter(Words.sentences());

    private Sheets() {}

    static Sheet of(String name, Course course, LocalDate today) {
        Reason called = name.isEmpty() ? Reason.of("handout.your-child") : Reason.of("handout.name", name);
        return WRITER.write(Handouts.facts(called, course, today), name, Locale.ENGLISH);
    }

    static Sheet of(Course course) {
        return of("Mara", course, course.latest().orElseThrow().date());
    }

    /** The sheet of a first visit with these entries, {@code column=text}. */
    static Sheet of(String... entries) {
        return of(new Course(CourseText.patient(CourseText.BORN.toString()), List.of(CourseText.exam(entries))));
    }

    /** The sheet of {@link #HELD} with some entries changed; an empty text removes a measure. */
    static Sheet heldBut(String... changes) {
        String[] all =
                Stream.concat(Arrays.stream(HELD), Arrays.stream(changes)).toArray(String[]::new);
        return of(all);
    }

    /** All that the sheet says, in one text. */
    static String text(Sheet sheet) {
        return String.join("\n", sheet.prose());
    }
}
