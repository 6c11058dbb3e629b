package plusward.review;

import java.time.LocalDate;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.springframework.stereotype.Component;
import plusward.course.Control;
import plusward.course.Course;
import plusward.course.CycloplegicInForce;
import plusward.course.Limits;
import plusward.course.Pattern;
import plusward.course.PublishedCourse;
import plusward.course.Trend;
import plusward.course.Visit;
import plusward.exam.Eye;
import plusward.exam.Reason;
import plusward.optics.Age;
import plusward.optics.Quantity;
import plusward.review.CourseDocument.EyeTrend;
import plusward.review.CourseDocument.FindingPart;
import plusward.review.CourseDocument.Interval;
import plusward.review.CourseDocument.PatternPart;
import plusward.review.CourseDocument.PublishedPart;
import plusward.review.CourseDocument.TrendPart;
import plusward.review.CourseDocument.UndecidedPart;
import plusward.review.CourseDocument.VisitPart;
import plusward.rules.Finding;
import plusward.rules.Rulebook;
import plusward.web.Sentences;

/** Writes a course as data: the core's answers with their sentences, number by number. */
@Component
final class CourseDocuments {

    private final Sentences sentences;
    private final DerivedParts derived;

    CourseDocuments(Sentences sentences) {
        this.sentences = sentences;
        this.derived = new DerivedParts(sentences);
    }

    CourseDocument write(Course course, LocalDate on, Limits limits) {
        Pattern pattern = Pattern.of(course, limits);
        return new CourseDocument(
                course.patient().clinicNumber(),
                course.patient().bornOn(),
                new PatternPart(pattern.kind().code(), worded(pattern.because())),
                trend(course),
                course.visits().stream().map(visit -> visit(visit, on, limits)).toList());
    }

    private TrendPart trend(Course course) {
        return new TrendPart(trend(course, Eye.RIGHT), trend(course, Eye.LEFT), published(course));
    }

    private static EyeTrend trend(Course course, Eye eye) {
        return course.latest()
                .flatMap(visit -> Trend.at(visit, eye))
                .map(CourseDocuments::trend)
                .orElse(EyeTrend.NONE);
    }

    private static EyeTrend trend(Trend trend) {
        return new EyeTrend(
                Numbers.plain(trend.slope().value()),
                Numbers.plain(trend.slope().low()),
                Numbers.plain(trend.slope().high()),
                trend.n(),
                Numbers.years(trend.fittedFrom()),
                Numbers.plain(trend.fitted()),
                Numbers.years(trend.projectedAge()),
                new Interval(
                        Numbers.plain(trend.projected().value()),
                        Numbers.plain(trend.projected().low()),
                        Numbers.plain(trend.projected().high())));
    }

    /** The published course from the first cycloplegic refraction to a year after the latest visit. */
    private static List<PublishedPart> published(Course course) {
        return course.visits().stream()
                .filter(visit -> !visit.exam().cycloplegic().isEmpty())
                .findFirst()
                .flatMap(first -> CycloplegicInForce.at(first)
                        .map(found -> PublishedCourse.from(first.age(), found.hyperopia(), yearAfterLatest(course))))
                .orElse(List.of())
                .stream()
                .map(point -> new PublishedPart(
                        Numbers.years(point.age()), Numbers.plain(point.low()), Numbers.plain(point.high())))
                .toList();
    }

    private static Age yearAfterLatest(Course course) {
        return course.latest().orElseThrow().age().plus(Age.of(1));
    }

    private VisitPart visit(Visit visit, LocalDate on, Limits limits) {
        Control control = Control.at(visit, limits);
        List<Finding> findings = Rulebook.judge(visit, on, limits);
        return new VisitPart(
                visit.date(),
                Numbers.years(visit.age()),
                new CourseDocument.ControlPart(control.state().code(), String.join(" ", worded(control.because()))),
                Pattern.at(visit, limits).kind().code(),
                derived.of(visit, limits),
                findings.stream()
                        .filter(Finding.Met.class::isInstance)
                        .map(Finding.Met.class::cast)
                        .sorted(Comparator.comparing(Finding.Met::weight))
                        .map(this::finding)
                        .toList(),
                findings.stream()
                        .filter(Finding.Undecided.class::isInstance)
                        .map(each -> new UndecidedPart(each.code(), sentences.of(each.because())))
                        .toList());
    }

    private FindingPart finding(Finding.Met met) {
        Map<String, Object> evidence = new LinkedHashMap<>();
        met.evidence().forEach((name, value) -> evidence.put(name, plain(value)));
        return new FindingPart(
                met.code(),
                met.weight().code(),
                sentences.of(met.because()),
                worded(met.checkFirst()),
                evidence,
                met.source().citation());
    }

    private static Object plain(Object value) {
        return value instanceof Quantity<?> quantity ? Numbers.plain(quantity) : value;
    }

    private List<String> worded(List<Reason> reasons) {
        return reasons.stream().map(sentences::of).toList();
    }
}
