package plusward.entry;

import java.util.List;
import java.util.Map;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Component;
import org.springframework.web.servlet.ModelAndView;
import plusward.entry.EntryPage.Answer;
import plusward.visit.RecordedVisit;

/** Answers a saved, refused, doubted or overtaken visit with its page; what is not stored is kept as a draft. */
@Component
class EntryAnswer {

    private final EntryPages pages;
    private final EntryDrafts drafts;

    EntryAnswer(EntryPages pages, EntryDrafts drafts) {
        this.pages = pages;
        this.drafts = drafts;
    }

    /**
     * The way to the course after a save; otherwise what was typed once more, with what is wrong or beside what is stored.
     *
     * @param typed the page as it was sent
     */
    ModelAndView to(Outcome outcome, EntryPage typed) {
        if (outcome instanceof Outcome.Saved saved) {
            drafts.forget(typed.child(), typed.visit(), typed.form());
            String day = saved.visit().date().toString();
            return new ModelAndView("redirect:/children/" + typed.child().id() + "?saved=" + day);
        }
        drafts.keep(typed.child(), typed.visit(), typed.form());
        if (outcome instanceof Outcome.Refusals refusals) {
            return asking(typed, new Answer(refusals.all(), List.of(), null));
        }
        if (outcome instanceof Outcome.Doubts doubts) {
            return asking(typed, new Answer(List.of(), doubts.all(), null));
        }
        return twoVersions(((Outcome.Overtaken) outcome).stored(), typed);
    }

    private ModelAndView twoVersions(RecordedVisit stored, EntryPage typed) {
        TwoVersions versions = TwoVersions.of(typed.child(), stored, typed.form());
        Map<String, Object> model = Map.of("page", versions, "history", pages.history(stored));
        return new ModelAndView("entry/two-versions", model, HttpStatus.CONFLICT);
    }

    ModelAndView form(EntryPage page) {
        return form(page, HttpStatus.OK);
    }

    private static ModelAndView asking(EntryPage typed, Answer answer) {
        return form(typed.with(answer), HttpStatus.UNPROCESSABLE_CONTENT);
    }

    private static ModelAndView form(EntryPage page, HttpStatus status) {
        return new ModelAndView("entry/edit", Map.of("page", page), status);
    }
}
