package plusward.handout;

import java.time.Clock;
import java.time.LocalDate;
import java.util.Locale;
import java.util.Map;
import org.springframework.stereotype.Component;
import plusward.child.ChildCard;
import plusward.course.Course;
import plusward.course.CycloplegicInForce;
import plusward.course.Limits;
import plusward.course.Visit;
import plusward.exam.Reason;
import plusward.visit.Visits;
import plusward.web.Paper;
import plusward.web.PdfPrinter;

/** Writes the sheet of a child's latest visit, or says why no true one can be written. */
@Component
class Handouts {

    private final Visits visits;
    private final SheetWriter writer;
    private final PdfPrinter printer;
    private final Clock clock;

    Handouts(Visits visits, SheetWriter writer, PdfPrinter printer, Clock clock) {
        this.visits = visits;
        this.writer = writer;
        this.printer = printer;
        this.clock = clock;
    }

    /**
     * The sheet in that language.
     *
     * @throws NoTrueSheet when something is missing without which the sheet would not be true
     */
    Sheet write(ChildCard child, String language) {
        if (!SheetLanguages.isWritten(language)) {
            throw new NoTrueSheet(Reason.of("handout.missing.language", language));
        }
        String given = child.givenName() == null ? "" : child.givenName().strip();
        Reason name = given.isEmpty() ? Reason.of("handout.your-child") : Reason.of("handout.name", given);
        SheetFacts facts = facts(name, visits.courseOf(child), LocalDate.now(clock));
        return writer.write(facts, child.shownName(), Locale.forLanguageTag(language));
    }

    byte[] print(Sheet sheet, Paper paper) {
        return printer.print("handout/print", Map.of("sheet", sheet), sheet.language(), paper);
    }

    /** What the paragraphs look at; refused without a visit, a recent cycloplegic refraction, hyperopia, or plus lenses. */
    static SheetFacts facts(Reason name, Course course, LocalDate today) {
        Visit visit = course.latest().orElseThrow(() -> new NoTrueSheet(Reason.of("handout.missing.visit")));
        CycloplegicInForce cycloplegic = CycloplegicInForce.at(visit)
                .orElseThrow(() -> new NoTrueSheet(Reason.of("handout.missing.cycloplegic", visit.date())));
        SheetFacts facts = SheetFacts.of(name, visit, cycloplegic, Limits.DEFAULT, today);
        if (!Focusing.isWorthSaying(facts.focusing().most())) {
            throw new NoTrueSheet(Reason.of("handout.missing.hyperopia", cycloplegic.takenOn()));
        }
        if (!facts.lenses().areMissing() && !facts.lenses().arePlus()) {
            throw new NoTrueSheet(Reason.of("handout.missing.plus-lenses"));
        }
        return facts;
    }
}
