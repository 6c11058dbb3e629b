package plusward.recall;

import java.time.Clock;
import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.springframework.stereotype.Controller;
import org.springframework.ui.Model;
import org.springframework.web.bind.annotation.GetMapping;
import plusward.child.ChildCard;
import plusward.child.Children;
import plusward.course.Course;
import plusward.course.Limits;
import plusward.draft.Drafts;
import plusward.visit.Visits;

/** The first page after signing in. */
@Controller
class NeedsALookController {

    private final Children children;
    private final Visits visits;
    private final Drafts drafts;
    private final Clock clock;

    NeedsALookController(Children children, Visits visits, Drafts drafts, Clock clock) {
        this.children = children;
        this.visits = visits;
        this.drafts = drafts;
        this.clock = clock;
    }

    @GetMapping("/")
    String needsALook(Model model) {
        LocalDate today = LocalDate.now(clock);
        Map<ChildCard, Course> courses = courses();
        model.addAttribute("rows", LookList.of(courses, today, Limits.DEFAULT));
        List<TodayRow> expected = TodayRow.of(courses, today);
        model.addAttribute("expected", expected);
        model.addAttribute(
                "next", expected.stream().filter(row -> !row.seen()).findFirst().orElse(null));
        model.addAttribute("drafts", DraftRow.of(drafts.mine(), courses.keySet(), clock.getZone()));
        model.addAttribute("children", courses.size());
        model.addAttribute("today", today);
        return "recall/needs-a-look";
    }

    private Map<ChildCard, Course> courses() {
        List<ChildCard> all = children.all();
        Map<Long, Course> courses = visits.coursesOf(all);
        return all.stream()
                .collect(Collectors.toMap(
                        Function.identity(),
                        child -> courses.getOrDefault(child.id(), new Course(child.patient(), List.of()))));
    }
}
