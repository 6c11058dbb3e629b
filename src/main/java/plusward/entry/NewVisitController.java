package plusward.entry;

import java.util.List;
import java.util.Map;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Controller;
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
    private final EntryAnswer answer;

    NewVisitController(Children children, EntryDesk desk, EntryPages pages, EntryAnswer answer) {
        this.children = children;
        this.desk = desk;
        this.pages = pages;
        this.answer = answer;
    }

    @ModelAttribute("child")
    ChildCard child(@PathVariable long childId) {
        return children.find(childId).orElseThrow(() -> new ResponseStatusException(HttpStatus.NOT_FOUND));
    }

    @GetMapping
    ModelAndView blank(@ModelAttribute(name = "child", binding = false) ChildCard child) {
        return answer.form(pages.blank(child));
    }

    @PostMapping
    ModelAndView save(
            @ModelAttribute(name = "child", binding = false) ChildCard child, @RequestParam Map<String, String> sent) {
        VisitForm form = VisitForm.of(sent);
        return answer.to(desk.record(child, form), pages.typed(child, null, form, List.of()));
    }

    /** "As last time", where there is no JavaScript to do it on the page. */
    @PostMapping(params = "copy")
    ModelAndView copyGlasses(
            @ModelAttribute(name = "child", binding = false) ChildCard child, @RequestParam Map<String, String> sent) {
        return answer.form(pages.withLastGlasses(child, null, VisitForm.of(sent)));
    }
}
