package plusward.entry;

import java.util.EnumSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import org.springframework.util.LinkedMultiValueMap;
import org.springframework.util.MultiValueMap;
import plusward.exam.Field;
import plusward.exam.Generator;

/** Visits as no clinic should send them, the same for the same seed; at least one field of each is wrong. */
final class MalformedVisits {

    /** What is wrong with a visit. */
    enum Kind {
        WRONG_NOTATION(
                "+3,50", "25", "ET", "20/", "2026-02-30", "+3.50 @ 90", "NaN", "1e5", "0x10", "=1+1", "{0}", "'"),
        WRONG_SIGN("3.50", "--3.50", "+-3.50", "-25", "±3", "+3.50 0.75 x 180", "- 20/25", "-ET 25", "−−1"),
        HUGE_NUMBER("9".repeat(70), "+1e308", "ET 99999", "20/99999999999999999999", "+99.00", "99999-01-01", "151"),
        CONTROL_CHARACTERS("a\u0000b", "\u0007", "\u001b[31m", "ET\u0000 25", "\u007f", "+3.50\u0000"),
        RIGHT_TO_LEFT("\u202eET 25", "שלום", "٢٥", "+٣٫٥٠", "\u200f+3.50\u061c", "ملاحظة"),
        LONG_NOTE("x"),
        UNPAIRED_SURROGATES("\ud800", "\udc00+3.50", "ET \ud83d", "a\udfffb", "\udc00\ud800"),
        DUPLICATED_PARAMETERS("ET", "3.50", "zzz"),
        LONG_FIELD("9", "+", "ET 1 ", " x", "\u00a0.", "(", "😀"),
        JUNK("zzz");

        private final List<String> texts;

        Kind(String... texts) {
            this.texts = List.of(texts);
        }
    }

    /** Fields in which any text is right, up to its length. */
    private static final Set<Field> FREE = EnumSet.of(Field.EXAMINER, Field.NOTE);

    private static final List<String> DAYS =
            List.of("", "2026-01-05", "+999999999-12-31", "-999999999-01-01", "0000-01-01", "x", "\u0000");

    private final Random random;
    private final Kind kind;
    private final MultiValueMap<String, String> sent = new LinkedMultiValueMap<>();

    private MalformedVisits(Kind kind, long seed) {
        this.kind = kind;
        this.random = new Random(seed);
    }

    /** The parameters of a request. */
    static MultiValueMap<String, String> of(Kind kind, long seed) {
        MalformedVisits visit = new MalformedVisits(kind, seed);
        new Generator(seed)
                .fields()
                .forEach((field, text) -> visit.sent.add(field.column(), kind == Kind.JUNK ? text : ""));
        visit.sent.set(Field.VISIT_DATE.column(), "2026-01-05");
        visit.sent.add("version", visit.pick(List.of("", "0", "-1", "99999999999999999999", "x")));
        visit.sent.add("day", visit.pick(DAYS));
        visit.sent.add("why", visit.pick(List.of("", "w".repeat(300), "\u0000")));
        visit.sent.add("confirmed", "sign-flipped:worn_right:\u0000");
        for (int i = 0; i <= seed % 7; i++) {
            visit.spoil(visit.pick(List.of(Field.values())));
        }
        visit.spoil(visit.pick(List.of(Field.WORN_RIGHT, Field.TURN_CC_NEAR, Field.ACUITY_LEFT, Field.DUCTIONS)));
        return visit.sent;
    }

    private void spoil(Field field) {
        String text = pick(kind.texts);
        switch (kind) {
            case LONG_NOTE -> sent.set(Field.NOTE.column(), text.repeat(1_000_000));
            case LONG_FIELD -> sent.set(field.column(), (text.repeat(10_000 / text.length()) + "!"));
            case DUPLICATED_PARAMETERS -> {
                if (!FREE.contains(field)) {
                    sent.put(field.column(), List.of(text, "+3.50", "ET 25", text));
                }
            }
            default -> {
                if (!FREE.contains(field)) {
                    sent.set(field.column(), text);
                }
            }
        }
    }

    private <T> T pick(List<T> choices) {
        return choices.get(random.nextInt(choices.size()));
    }
}
