package plusward.review;

import java.time.Clock;
import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Controller;
import org.springframework.ui.Model;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.bind.annotation.ResponseBody;
import org.springframework.web.server.ResponseStatusException;
import plusward.child.ChildCard;
import plusward.child.Children;
import plusward.course.Limits;
import plusward.visit.Visits;

/** The Course page and the course as data. */
@Controller
class CourseController {

    /** The series of chart one in the order of their switches. */
    private static final List<String> SERIES = List.of(
            "cycloplegicRight",
            "cycloplegicLeft",
            "wornRight",
            "wornLeft",
            "scDistance",
            "scNear",
            "ccDistance",
            "ccNear",
            "addNear");

    private final Children children;
    private final Visits visits;
    private final CoursePages pages;
    private final CourseDocuments documents;
    private final Clock clock;

    CourseController(Children children, Visits visits, CoursePages pages, CourseDocuments documents, Clock clock) {
        this.children = children;
        this.visits = visits;
        this.pages = pages;
        this.documents = documents;
        this.clock = clock;
    }

    @GetMapping("/children/{id}")
    String course(@PathVariable long id, @RequestParam(required = false) @Nullable LocalDate saved, Model model) {
        ChildCard child = children.find(id).orElseThrow(CourseController::missing);
        LocalDate today = LocalDate.now(clock);
        model.addAttribute("page", pages.of(child, visits.of(child), today, Limits.DEFAULT));
        model.addAttribute("limits", Limits.DEFAULT);
        model.addAttribute("series", SERIES);
        model.addAttribute("today", today);
        model.addAttribute("saved", saved);
        return "review/course";
    }

    @GetMapping("/children/{id}/course.json")
    @ResponseBody
    CourseDocument data(@PathVariable long id) {
        return document(children.find(id).orElseThrow(CourseController::missing));
    }

    @GetMapping("/api/children/{clinicNumber}/course")
    @ResponseBody
    CourseDocument dataByNumber(@PathVariable String clinicNumber) {
        return document(children.findByClinicNumber(clinicNumber).orElseThrow(CourseController::missing));
    }

    private CourseDocument document(ChildCard child) {
        return documents.write(visits.courseOf(child), LocalDate.now(clock), Limits.DEFAULT);
    }

    private static ResponseStatusException missing() {
        return new ResponseStatusException(HttpStatus.NOT_FOUND);
    }
}
