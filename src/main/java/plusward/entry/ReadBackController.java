package plusward.entry;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Controller;
import org.springframework.ui.Model;
import org.springframework.util.MultiValueMap;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.server.ResponseStatusException;
import plusward.child.ChildCard;
import plusward.child.Children;
import plusward.visit.RecordedVisit;
import plusward.visit.Visits;

/** Answers each change on the entry page: keeps the draft, and reads back what is typed. */
@Controller
@RequestMapping("/children/{childId}/visits")
class ReadBackController {

    private final Children children;
    private final Visits visits;
    private final EntryPages pages;
    private final EntryDrafts drafts;

    ReadBackController(Children children, Visits visits, EntryPages pages, EntryDrafts drafts) {
        this.children = children;
        this.visits = visits;
        this.pages = pages;
        this.drafts = drafts;
    }

    @PostMapping("/new/read-back")
    String readNew(@PathVariable long childId, @RequestParam MultiValueMap<String, String> sent, Model model) {
        return read(child(childId), null, VisitForm.of(sent), model);
    }

    @PostMapping("/{visitId}/edit/read-back")
    String readStored(
            @PathVariable long childId,
            @PathVariable long visitId,
            @RequestParam MultiValueMap<String, String> sent,
            Model model) {
        ChildCard child = child(childId);
        return read(child, found(visits.find(child, visitId)), VisitForm.of(sent), model);
    }

    private String read(ChildCard child, @Nullable RecordedVisit visit, VisitForm form, Model model) {
        model.addAttribute("kept", drafts.keep(child, visit, form));
        model.addAttribute("now", pages.now());
        model.addAttribute("page", pages.typed(child, visit, form));
        return "entry/read-back";
    }

    private ChildCard child(long id) {
        return found(children.find(id));
    }

    private static <T> T found(Optional<T> sought) {
        return sought.orElseThrow(() -> new ResponseStatusException(HttpStatus.NOT_FOUND));
    }
}
