package plusward.handout;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;

/**
 * The finished sheet, in one language, as templates show it.
 *
 * @param title its heading
 * @param childName whose sheet it is
 * @param date the day of the visit that it tells of
 * @param parts what it says
 * @param numbers the exact numbers
 * @param eye the drawing of the focusing eye
 * @param line the drawing of the lens; absent without a line to draw
 * @param signs what calls for the clinic at once
 * @param words the fixed words of the sheet by the end of their key
 */
record Sheet(
        Locale language,
        String title,
        String childName,
        String date,
        List<Part> parts,
        List<Line> numbers,
        EyeDrawing eye,
        @Nullable LensDrawing line,
        List<String> signs,
        UnaryOperator<String> words) {

    /** One section: its heading and its paragraphs. */
    record Part(String code, String heading, List<String> paragraphs) {}

    /** One of the exact numbers. */
    record Line(String label, String value) {}

    /** A fixed word or sentence of the sheet, in its language. */
    public String word(String key) {
        return words.apply(key);
    }

    /** What a parent reads from top to bottom, a paragraph each; headings, labels and the exact numbers left out. */
    List<String> prose() {
        List<String> prose = new ArrayList<>();
        parts.forEach(part -> prose.addAll(part.paragraphs()));
        prose.addAll(signs);
        prose.add(word("caution"));
        return prose;
    }
}
