package plusward.course;

import java.time.LocalDate;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import plusward.exam.Examination;
import plusward.exam.Generator;

/** Random courses, the same in every run: every other one of anything that can be typed, the others of what a clinic sees. */
public final class RandomCourses {

    private static final int NUMBER = 120;
    private static final LocalDate FIRST = LocalDate.parse("2020-01-15");

    /** When the turn was first seen, in months of age: early, late (from 72), or not known. */
    private static final List<Patient> CHILDREN = List.of(
            CourseText.patient("2017-03-03", 30),
            CourseText.patient("2017-03-03", 84),
            CourseText.patient("2017-03-03", null));

    private RandomCourses() {}

    /** All of them. */
    public static List<Course> all() {
        return LongStream.range(0, NUMBER)
                .mapToObj(seed -> course(seed, seed % 2 == 0 ? new Generator(seed)::examination : clinic(seed)))
                .toList();
    }

    private static Course course(long seed, Visits visits) {
        int number = 1 + new Random(seed).nextInt(6);
        return new Course(
                CHILDREN.get((int) (seed % CHILDREN.size())),
                IntStream.range(0, number)
                        .mapToObj(i -> visits.on(FIRST.plusDays(120L * i + seed % 60)))
                        .toList());
    }

    private interface Visits {
        Examination on(LocalDate day);
    }

    /** Turns around the limits, plus around full, dates around eight weeks; a quarter of each missing; every fifth child is never refracted. */
    private static Visits clinic(long seed) {
        Random random = new Random(seed);
        String[] plus = {"+3.00", "+3.50", "+3.75 -0.50 x 90", "+4.00"};
        String[] refractions = seed % 5 == 0 ? new String[] {""} : plus;
        String[] turns = {
            "ET 30", "ET 22", "E(T) 15", "ET 14", "ET 10", "E 9", "E 14", "E 4", "ortho", "X 4", "X(T) 8", "X(T) 12"
        };
        String[] acuities = {"20/20", "20/25-1", "20/32", "20/40", "20/63", "CF"};
        String[] heights = {"+1.5", "-2.0", "-4.0"};
        return day -> CourseText.exam(
                "visit_date=" + day,
                "wear_hours=" + pick(random, "7.5", "8", "14"),
                "worn_right=" + pick(random, plus),
                "worn_left=" + pick(random, plus),
                "worn_add=" + pick(random, "", "2.50"),
                "worn_since="
                        + pick(
                                random,
                                day.minusWeeks(8).toString(),
                                day.minusDays(55).toString()),
                "made_right=" + pick(random, plus),
                "made_left=" + pick(random, plus),
                "made_add=" + pick(random, "2.00", "2.50"),
                "acuity_right=" + pick(random, acuities),
                "acuity_left=" + pick(random, acuities),
                "cycloplegic_right=" + pick(random, refractions),
                "cycloplegic_left=" + pick(random, refractions),
                "manifest_right=" + pick(random, "+2.00", "+3.75"),
                "manifest_left=" + pick(random, "+2.00", "+3.75"),
                "turn_sc_distance=" + pick(random, "ET 40", "ET 32", "ET 22"),
                "turn_sc_near=" + pick(random, "ET 40", "ET 32", "ET 22"),
                "turn_cc_distance=" + pick(random, turns),
                "turn_cc_near=" + pick(random, turns),
                "turn_add_near=" + pick(random, turns),
                "segment_right_mm=" + pick(random, heights),
                "segment_left_mm=" + pick(random, heights),
                "next_visit_weeks=" + pick(random, "4", "26"));
    }

    private static String pick(Random random, String... choices) {
        return random.nextInt(4) == 0 ? "" : choices[random.nextInt(choices.length)];
    }
}
