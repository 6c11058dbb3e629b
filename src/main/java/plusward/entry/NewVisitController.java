package plusward.entry;

import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Controller;
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

/** Logs a new visit. */
@Controller
@RequestMapping("/children/{childId}/visits/new")
class NewVisitController {

    private final Children children;
    private final EntryDesk desk;
    private final EntryPages pages;
    private final EntryDrafts drafts;
    private final EntryAnswer answer;

    NewVisitController(Children children, EntryDesk desk, EntryPages pages, EntryDrafts drafts, EntryAnswer answer) {
        this.children = children;
        this.desk = desk;
        this.pages = pages;
        this.drafts = drafts;
        this.answer = answer;
    }

    @ModelAttribute("child")
    ChildCard child(@PathVariable long childId) {
        return children.find(childId).orElseThrow(() -> new ResponseStatusException(HttpStatus.NOT_FOUND));
    }

    /** Goes on with a draft where there is one. */
    @GetMapping
    ModelAndView open(@ModelAttribute(name = "child", binding = false) ChildCard child) {
        return answer.form(drafts.of(child, null)
                .map(draft -> pages.draft(child, null, draft))
                .orElseGet(() -> pages.blank(child)));
    }

    /** Goes on with the draft that was begun for that day; without one it begins anew. */
    @GetMapping(params = "day")
    ModelAndView open(@ModelAttribute(name = "child", binding = false) ChildCard child, @RequestParam String day) {
        return answer.form(drafts.begunFor(child, day)
                .map(draft -> pages.draft(child, null, draft))
                .orElseGet(() -> pages.blank(child)));
    }

    /** Begins another one, for today, beside the draft of another day. */
    @GetMapping(params = "another")
    ModelAndView another(@ModelAttribute(name = "child", binding = false) ChildCard child) {
        return answer.form(pages.blank(child));
    }

    @PostMapping
    ModelAndView save(
            @ModelAttribute(name = "child", binding = false) ChildCard child,
            @RequestParam MultiValueMap<String, String> sent) {
        VisitForm form = VisitForm.of(sent);
        return answer.to(desk.record(child, form), pages.typed(child, null, form));
    }

    /** Reads back what is typed before it is saved, where there is no JavaScript to do it on the page. */
    @PostMapping(params = "check")
    ModelAndView check(
            @ModelAttribute(name = "child", binding = false) ChildCard child,
            @RequestParam MultiValueMap<String, String> sent) {
        VisitForm form = VisitForm.of(sent);
        drafts.keep(child, null, form);
        return answer.form(pages.typed(child, null, form));
    }

    /** "As last time", where there is no JavaScript to do it on the page. */
    @PostMapping(params = "copy")
    ModelAndView copyGlasses(
            @ModelAttribute(name = "child", binding = false) ChildCard child,
            @RequestParam MultiValueMap<String, String> sent) {
        return answer.form(pages.withLastGlasses(child, null, VisitForm.of(sent)));
    }

    @PostMapping(params = "discard")
    String discard(
            @ModelAttribute(name = "child", binding = false) ChildCard child,
            @RequestParam MultiValueMap<String, String> sent) {
        drafts.forget(child, null, VisitForm.of(sent));
        return "redirect:/children/" + child.id();
    }
}
