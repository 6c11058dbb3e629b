package plusward.entry;

import java.util.Map;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Component;
import org.springframework.web.servlet.ModelAndView;

/** Answers a saved, refused or overtaken visit with its page. */
@Component
class EntryAnswer {

    private final EntryPages pages;

    EntryAnswer(EntryPages pages) {
        this.pages = pages;
    }

    /**
     * The way to the course after a save; otherwise what was typed once more, with what is wrong or beside what is stored.
     *
     * @param typed the page as it was sent
     */
    ModelAndView to(Outcome outcome, EntryPage typed) {
        if (outcome instanceof Outcome.Refusals refused) {
            return form(typed.refusing(refused.all()), HttpStatus.UNPROCESSABLE_CONTENT);
        }
        if (outcome instanceof Outcome.Overtaken overtaken) {
            TwoVersions versions = TwoVersions.of(typed.child(), overtaken.stored(), typed.form());
            History history = pages.history(overtaken.stored());
            return new ModelAndView(
                    "entry/two-versions", Map.of("page", versions, "history", history), HttpStatus.CONFLICT);
        }
        return new ModelAndView("redirect:/children/" + typed.child().id() + "?saved");
    }

    ModelAndView form(EntryPage page) {
        return form(page, HttpStatus.OK);
    }

    private static ModelAndView form(EntryPage page, HttpStatus status) {
        return new ModelAndView("entry/edit", Map.of("page", page), status);
    }
}
