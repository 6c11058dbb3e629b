package plusward.entry;

import java.util.Map;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Controller;
import org.springframework.ui.Model;
import org.springframework.util.MultiValueMap;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.ModelAttribute;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.server.ResponseStatusException;
import org.springframework.web.servlet.ModelAndView;
import plusward.child.ChildCard;
import plusward.child.Children;
import plusward.visit.RecordedVisit;
import plusward.visit.Visits;

/** Reads and corrects a visit that is stored. */
@Controller
@RequestMapping("/children/{childId}/visits/{visitId}")
class StoredVisitController {

    private final Children children;
    private final Visits visits;
    private final EntryDesk desk;
    private final EntryPages pages;
    private final EntryDrafts drafts;
    private final EntryAnswer answer;

    StoredVisitController(
            Children children,
            Visits visits,
            EntryDesk desk,
            EntryPages pages,
            EntryDrafts drafts,
            EntryAnswer answer) {
        this.children = children;
        this.visits = visits;
        this.desk = desk;
        this.pages = pages;
        this.drafts = drafts;
        this.answer = answer;
    }

    @ModelAttribute
    void read(@PathVariable long childId, @PathVariable long visitId, Model model) {
        ChildCard child = children.find(childId).orElseThrow(StoredVisitController::missing);
        model.addAttribute("child", child);
        model.addAttribute("visit", visits.find(child, visitId).orElseThrow(StoredVisitController::missing));
    }

    @GetMapping
    ModelAndView show(
            @ModelAttribute(name = "child", binding = false) ChildCard child,
            @ModelAttribute(name = "visit", binding = false) RecordedVisit visit) {
        return new ModelAndView(
                "entry/visit", Map.of("page", pages.stored(child, visit), "history", pages.history(visit)));
    }

    @GetMapping("/edit")
    ModelAndView edit(
            @ModelAttribute(name = "child", binding = false) ChildCard child,
            @ModelAttribute(name = "visit", binding = false) RecordedVisit visit) {
        return answer.form(drafts.of(child, visit)
                .map(draft -> pages.draft(child, visit, draft))
                .orElseGet(() -> pages.stored(child, visit)));
    }

    @PostMapping("/edit")
    ModelAndView save(
            @ModelAttribute(name = "child", binding = false) ChildCard child,
            @ModelAttribute(name = "visit", binding = false) RecordedVisit visit,
            @RequestParam MultiValueMap<String, String> sent) {
        VisitForm form = VisitForm.of(sent);
        Outcome outcome = desk.correct(child, visit, form);
        return answer.to(outcome, pages.typed(child, visit, form));
    }

    /** "As last time", where there is no JavaScript to do it on the page. */
    @PostMapping(path = "/edit", params = "copy")
    ModelAndView copyGlasses(
            @ModelAttribute(name = "child", binding = false) ChildCard child,
            @ModelAttribute(name = "visit", binding = false) RecordedVisit visit,
            @RequestParam MultiValueMap<String, String> sent) {
        return answer.form(pages.withLastGlasses(child, visit, VisitForm.of(sent)));
    }

    /** Reads back what is typed before it is saved, where there is no JavaScript to do it on the page. */
    @PostMapping(path = "/edit", params = "check")
    ModelAndView check(
            @ModelAttribute(name = "child", binding = false) ChildCard child,
            @ModelAttribute(name = "visit", binding = false) RecordedVisit visit,
            @RequestParam MultiValueMap<String, String> sent) {
        VisitForm form = VisitForm.of(sent);
        drafts.keep(child, visit, form);
        return answer.form(pages.typed(child, visit, form));
    }

    @PostMapping(path = "/edit", params = "discard")
    String discard(
            @ModelAttribute(name = "child", binding = false) ChildCard child,
            @ModelAttribute(name = "visit", binding = false) RecordedVisit visit) {
        drafts.forget(child, visit, VisitForm.of(visit));
        return "redirect:/children/" + child.id();
    }

    /** From two versions back to typing, with the choices made so far. */
    @PostMapping(path = "/edit", params = "type")
    ModelAndView goOnTyping(
            @ModelAttribute(name = "child", binding = false) ChildCard child,
            @ModelAttribute(name = "visit", binding = false) RecordedVisit visit,
            @RequestParam MultiValueMap<String, String> sent) {
        return answer.form(pages.typed(child, visit, VisitForm.of(sent)));
    }

    private static ResponseStatusException missing() {
        return new ResponseStatusException(HttpStatus.NOT_FOUND);
    }
}
