package plusward.review;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.springframework.stereotype.Component;
import plusward.child.ChildCard;
import plusward.course.Control;
import plusward.course.Course;
import plusward.course.Limits;
import plusward.course.Pattern;
import plusward.course.Visit;
import plusward.course.VisitModel;
import plusward.exam.Reason;
import plusward.review.CoursePage.Overview;
import plusward.rules.Finding;
import plusward.rules.Ladder;
import plusward.rules.Rulebook;
import plusward.visit.RecordedVisit;

/** Puts the Course page together from the core's answers. */
@Component
final class CoursePages {

    CoursePage of(ChildCard child, List<RecordedVisit> recorded, LocalDate on, Limits limits) {
        Course course = new Course(
                child.patient(),
                recorded.stream().map(RecordedVisit::examination).toList());
        Map<LocalDate, Long> ids = recorded.stream().collect(Collectors.toMap(RecordedVisit::date, RecordedVisit::id));
        return new CoursePage(
                child,
                course.latest()
                        .map(latest -> overview(course, latest, on, limits))
                        .orElse(null),
                newestFirst(course)
                        .map(visit -> VisitRow.of(ids.getOrDefault(visit.date(), 0L), visit, on, limits))
                        .toList());
    }

    private static Overview overview(Course course, Visit latest, LocalDate on, Limits limits) {
        List<Finding> findings = Rulebook.judge(latest, on, limits);
        boolean notHeld = Control.at(latest, limits).state().isNotHeld();
        return new Overview(
                Answers.at(latest, limits),
                patternSentences(Pattern.at(latest, limits)),
                notHeld ? Ladder.at(latest, on, limits) : List.of(),
                met(findings),
                undecided(findings),
                ModelSentences.at(latest),
                VisitModel.at(latest).readings(),
                TrendSentences.at(latest),
                ChartSentences.of(course));
    }

    private static Stream<Visit> newestFirst(Course course) {
        return course.visits().stream().sorted(Comparator.comparing(Visit::date).reversed());
    }

    private static List<Reason> patternSentences(Pattern pattern) {
        List<Reason> sentences = new ArrayList<>();
        sentences.add(Reason.of("pattern.kind." + pattern.kind().code()));
        sentences.addAll(pattern.because());
        return sentences;
    }

    private static List<Finding.Met> met(List<Finding> findings) {
        return findings.stream()
                .filter(Finding.Met.class::isInstance)
                .map(Finding.Met.class::cast)
                .sorted(Comparator.comparing(Finding.Met::weight))
                .toList();
    }

    private static List<Finding.Undecided> undecided(List<Finding> findings) {
        return findings.stream()
                .filter(Finding.Undecided.class::isInstance)
                .map(Finding.Undecided.class::cast)
                .toList();
    }
}
