package plusward.exchange;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.springframework.stereotype.Component;
import plusward.child.ChildCard;
import plusward.child.ChildDetails;
import plusward.child.Children;
import plusward.course.Course;
import plusward.exam.Examination;
import plusward.visit.Visits;

/** The clinic's children and visits as an import sees them, always many at once. */
@Component
class ClinicRecords {

    /** Beyond this many it is cheaper to read all children than to name them. */
    private static final int FEW = 500;

    private final Children children;
    private final Visits visits;

    ClinicRecords(Children children, Visits visits) {
        this.children = children;
        this.visits = visits;
    }

    boolean isEmpty() {
        return children.all().isEmpty();
    }

    StoredClinic of(Set<String> clinicNumbers) {
        Map<String, ChildCard> cards = cards(clinicNumbers);
        Map<String, ChildFacts> facts = new HashMap<>();
        cards.forEach((number, card) -> facts.put(number, ChildFacts.of(card.details())));
        Map<String, Map<LocalDate, Examination>> examinations = new HashMap<>();
        visits.coursesOf(cards.values())
                .values()
                .forEach(course -> examinations.put(course.patient().clinicNumber(), byDate(course)));
        return new StoredClinic(facts, examinations);
    }

    private static Map<LocalDate, Examination> byDate(Course course) {
        return course.examinations().stream().collect(Collectors.toMap(Examination::date, Function.identity()));
    }

    void store(Plan plan) {
        List<ChildDetails> details = Stream.of(
                        plan.children().added(), plan.children().changed())
                .flatMap(List::stream)
                .map(ChildFacts::details)
                .toList();
        children.bringIn(details);
        Map<String, List<Examination>> byNumber = new LinkedHashMap<>();
        Stream.of(plan.visits().added(), plan.visits().changed())
                .flatMap(List::stream)
                .forEach(visit -> byNumber.computeIfAbsent(visit.clinicNumber(), number -> new ArrayList<>())
                        .add(visit.examination()));
        Map<String, ChildCard> cards = cards(byNumber.keySet());
        Map<ChildCard, List<Examination>> byChild = new LinkedHashMap<>();
        byNumber.forEach(
                (number, examinations) -> byChild.put(Objects.requireNonNull(cards.get(number)), examinations));
        visits.bringIn(byChild);
    }

    private Map<String, ChildCard> cards(Set<String> clinicNumbers) {
        if (clinicNumbers.size() <= FEW) {
            return children.withClinicNumbers(clinicNumbers);
        }
        return children.all().stream()
                .filter(card -> clinicNumbers.contains(card.clinicNumber()))
                .collect(Collectors.toMap(ChildCard::clinicNumber, Function.identity()));
    }
}
