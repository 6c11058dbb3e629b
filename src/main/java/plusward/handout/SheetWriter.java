package plusward.handout;

import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import org.springframework.stereotype.Component;
import plusward.exam.Reason;
import plusward.web.Sentences;

/** Lets every paragraph speak, and words what they say in the language asked for. */
@Component
class SheetWriter {

    private static final List<String> SIGNS =
            List.of("new-turn", "double", "lid", "pupil-size", "pupil-white", "headache", "unsteady");

    private final Sentences sentences;

    SheetWriter(Sentences sentences) {
        this.sentences = sentences;
    }

    Sheet write(SheetFacts facts, String childName, Locale language) {
        return new Sheet(
                language,
                worded(facts.sentence("title"), language),
                childName,
                worded(Phrases.date(facts.visit().date()), language),
                Section.ALL.stream()
                        .map(section -> part(section, facts, language))
                        .filter(part -> !part.paragraphs().isEmpty())
                        .toList(),
                numbers(facts, language),
                EyeDrawing.of(facts),
                LensDrawing.of(facts),
                SIGNS.stream()
                        .map(sign -> worded(facts.sentence("sign." + sign), language))
                        .toList(),
                key -> worded(facts.sentence(key), language));
    }

    private Sheet.Part part(Section section, SheetFacts facts, Locale language) {
        List<String> paragraphs = section.paragraphs().stream()
                .map(paragraph -> paragraph.say(facts))
                .filter(said -> !said.isEmpty())
                .map(said -> said.stream().map(each -> worded(each, language)).collect(Collectors.joining(" ")))
                .toList();
        return new Sheet.Part(section.code(), worded(section.heading(facts), language), paragraphs);
    }

    private List<Sheet.Line> numbers(SheetFacts facts, Locale language) {
        return Numbers.of(facts).stream()
                .map(each -> new Sheet.Line(worded(each.label(), language), worded(each.value(), language)))
                .toList();
    }

    /** A sentence that begins with a value, such as "your child", still begins with a capital. */
    private String worded(Reason reason, Locale language) {
        String text = sentences.of(reason, language);
        int first = text.offsetByCodePoints(0, text.isEmpty() ? 0 : 1);
        return text.substring(0, first).toUpperCase(language) + text.substring(first);
    }
}
