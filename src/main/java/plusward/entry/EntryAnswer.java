package plusward.entry;

import java.util.Map;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Component;
import org.springframework.web.servlet.ModelAndView;
import plusward.visit.RecordedVisit;

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
        if (outcome instanceof Outcome.Refusals refusals) {
            return form(typed.refusing(refusals.all()), HttpStatus.UNPROCESSABLE_CONTENT);
        }
        if (outcome instanceof Outcome.Overtaken overtaken) {
            return twoVersions(overtaken.stored(), typed);
        }
        String saved = ((Outcome.Saved) outcome).visit().date().toString();
        return new ModelAndView("redirect:/children/" + typed.child().id() + "?saved=" + saved);
    }

    private ModelAndView twoVersions(RecordedVisit stored, EntryPage typed) {
        TwoVersions versions = TwoVersions.of(typed.child(), stored, typed.form());
        Map<String, Object> model = Map.of("page", versions, "history", pages.history(stored));
        return new ModelAndView("entry/two-versions", model, HttpStatus.CONFLICT);
    }

    ModelAndView form(EntryPage page) {
        return form(page, HttpStatus.OK);
    }

    private static ModelAndView form(EntryPage page, HttpStatus status) {
        return new ModelAndView("entry/edit", Map.of("page", page), status);
    }
}
