package plusward.exam;

import java.time.LocalDate;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import java.util.function.Supplier;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.optics.Dioptres;
import plusward.optics.Lens;
import plusward.optics.Millimetres;
import plusward.optics.PrismDioptres;

/**
 * Random measures and whole visits for property tests, the same for the same seed.
 *
 * <p>Everything it makes is within the ranges of the notation and in its steps; about a quarter of what may be missing is
 * missing. {@link #junk()} makes texts that are not in any notation, or almost in one.
 */
public final class Generator {

    private static final List<String> ALMOST = List.of(
            "+3.50 -0.75 x",
            "ET",
            "25",
            "E(T",
            "20/",
            "/20",
            "20/25-",
            "0.10 logMA",
            "2026-02-30",
            "2026-3-4",
            "+",
            "-",
            "−",
            ".",
            "x 90",
            "+3.50 x 90",
            "nil!",
            "flat-top",
            "right abduction,",
            "left",
            "normal, right abduction",
            "prefers",
            "+3,50",
            "ET 25 ET 30",
            "RHT 4 LHT 4",
            "ET' 6'",
            "NaN",
            "Infinity",
            "1e5",
            "0x10",
            "+3.50 -0.75 @ 180",
            "=1+1",
            "${1}",
            "{0}",
            "'",
            "\"",
            "٣",
            "１２");

    private static final List<String> CHARACTERS = List.of(
            "+", "-", ".", "/", " ", "x", "0", "5", "9", "E", "T", "(", ")", "'", "Δ", ",", "pd", "\t", "\n", "\r",
            "\u0000", "\u001b", "\u007f", "\u200f", "\u202e", "\u00a0", "\ufeff", "\ud800", "\udc00", "ش", "ı", "ß",
            "😀", "%s", "$1", "\\");

    private static final List<String> LONG = List.of(" ", "9", "+", "ET 1 ", "a", "1 ", ".", "\n", "x", "\u00a0", "😀");

    private final Random random;

    public Generator(long seed) {
        random = new Random(seed);
    }

    public Lens lens() {
        double cylinder = random.nextBoolean() ? 0 : hundredths(-15, 15);
        return Lens.of(hundredths(-30, 30), cylinder, random.nextInt(181));
    }

    /** A turn with a horizontal part, a vertical part, or both. */
    public Turn turn() {
        HorizontalTurn horizontal =
                new HorizontalTurn(pick(HorizontalTurn.Direction.values()), pick(Phase.values()), prism());
        VerticalTurn vertical = new VerticalTurn(pick(Eye.values()), pick(Phase.values()), prism());
        return switch (random.nextInt(4)) {
            case 0 -> new Turn(null, vertical);
            case 1 -> new Turn(horizontal, vertical);
            case 2 -> new Turn(HorizontalTurn.ORTHO, null);
            default -> new Turn(horizontal, null);
        };
    }

    /** One prism to 150 Δ, or two that together stay under that. */
    public PrismReading prism() {
        PrismDioptres one = PrismDioptres.of(random.nextInt(501) / 10.0);
        return random.nextInt(3) == 0
                ? new PrismReading(one, PrismDioptres.of(random.nextInt(501) / 10.0))
                : PrismReading.of(random.nextInt(1501) / 10.0);
    }

    public Acuity acuity() {
        String letters = pick("", "", "-2", "+1", " − 3");
        return Acuity.parse(
                switch (random.nextInt(5)) {
                    case 0 -> "20/" + (10 + random.nextInt(391)) + letters;
                    case 1 -> "6/" + pick("4.8", "6", "7.5", "9.5", "12", "60") + letters;
                    case 2 -> pick("0.8", "1.0", ".5", "0.05", "1", "2", "1.25");
                    case 3 -> pick("0.10", "-0.1", "−0.08", "1.3", "2") + pick(" logMAR", "logmar", " LogMAR");
                    default -> pick("CF", "hm", "LP", "nlp", "fixes and follows", "Fixes and Follows");
                });
    }

    public Stereo stereo() {
        return random.nextInt(4) == 0 ? Stereo.NIL : new Stereo(1 + random.nextInt(10_000));
    }

    public Millimetres height() {
        return Millimetres.of(hundredths(-20, 20));
    }

    public LensPair lensPair() {
        return new LensPair(perEye(this::lens), maybe(this::add));
    }

    public LocalDate date() {
        return LocalDate.of(1900, 1, 1).plusDays(random.nextInt(109_572));
    }

    /** A visit on any day. */
    public Examination examination() {
        return examination(date());
    }

    /** A visit on this day. */
    public Examination examination(LocalDate date) {
        return new Examination(
                date,
                maybe(() -> pick("D. Osterlund", "م. ن.", "O'Hara; x", "=1+1", "😀")),
                new Glasses(lensPair(), maybe(this::date), maybe(() -> HoursPerDay.of(hundredths(0, 24)))),
                lensPair(),
                acuities(),
                acuities(),
                maybe(this::stereo),
                turns(),
                motility(),
                new Cycloplegic(
                        perEye(this::lens),
                        maybe(() -> pick(CycloplegicAgent.values())),
                        maybe(() -> 1 + random.nextInt(10)),
                        maybe(() -> 1 + random.nextInt(1440))),
                perEye(this::lens),
                segment(),
                maybe(() -> Millimetres.of(hundredths(30, 80))),
                lensPair(),
                maybe(() -> random.nextInt(261)),
                maybe(() -> pick("one line", "two\nlines", "a\ttab", "\"quoted\", with; all", "ملاحظة", "Δ 😀")));
    }

    /** The fields of a visit, each empty, right, almost right or not at all. */
    public Map<Field, String> fields() {
        Map<Field, String> fields = new EnumMap<>(Field.class);
        Map<Field, String> right = ExaminationWriter.write(examination());
        for (Field field : Field.values()) {
            fields.put(field, random.nextBoolean() ? junk() : right.getOrDefault(field, ""));
        }
        return fields;
    }

    /** A short text that is in no notation, or only just beside one. */
    public String junk() {
        if (random.nextInt(4) == 0) {
            return pick(ALMOST.toArray(String[]::new));
        }
        StringBuilder text = new StringBuilder();
        Stream.generate(() -> pick(CHARACTERS.toArray(String[]::new)))
                .limit(random.nextInt(90))
                .forEach(text::append);
        return text.toString();
    }

    /** Over a million characters, chosen to make a careless pattern try every way of splitting them. */
    public String megabyte() {
        String start = pick("", "+3.50 ", "ET 25", "25", "20/25", "2026-03-14", "+3.50 -0.75 x ");
        String part = pick(LONG.toArray(String[]::new));
        return start + part.repeat(1_100_000 / part.length()) + pick("", "!", "x 90", "ET");
    }

    private Turns turns() {
        Map<TurnCondition, Turn> turns = new EnumMap<>(TurnCondition.class);
        for (TurnCondition condition : TurnCondition.values()) {
            Turn turn = maybe(this::turn);
            if (turn != null) {
                turns.put(condition, turn);
            }
        }
        return new Turns(turns, maybe(this::add));
    }

    private Acuities acuities() {
        return new Acuities(perEye(this::acuity), maybe(this::acuity));
    }

    /** What is limited, about half of the time nothing. */
    public Ductions ductions() {
        return random.nextBoolean() ? Ductions.NORMAL : new Ductions(limited(), limited());
    }

    private Set<Duction> limited() {
        return Arrays.stream(Duction.values())
                .filter(duction -> random.nextBoolean())
                .collect(Collectors.toSet());
    }

    private Motility motility() {
        Map<Gaze, Turn> gazes = new EnumMap<>(Gaze.class);
        for (Gaze gaze : Gaze.values()) {
            Turn turn = maybe(this::turn);
            if (turn != null) {
                gazes.put(gaze, turn);
            }
        }
        return new Motility(gazes, maybe(this::ductions), maybe(() -> pick(FixationPreference.values())));
    }

    /** Heights of which at most 20 mm lie between, and offsets within 0.05 mm of what they give. */
    private Segment segment() {
        SegmentHeights heights = new SegmentHeights(
                perEye(() -> Millimetres.of(hundredths(20, 40))), perEye(() -> Millimetres.of(hundredths(20, 40))));
        PerEye<Millimetres> byHeights = heights.offset();
        return new Segment(
                maybe(() -> pick(SegmentStyle.values())),
                new PerEye<>(offset(byHeights.right()), offset(byHeights.left())),
                heights,
                maybe(() -> Millimetres.of(hundredths(1, 10))));
    }

    private @Nullable Millimetres offset(@Nullable Millimetres byHeights) {
        return maybe(
                () -> byHeights == null ? height() : byHeights.plus(Millimetres.of((random.nextInt(11) - 5) / 100.0)));
    }

    private Dioptres add() {
        return Dioptres.of(hundredths(0, 4));
    }

    private <T> PerEye<T> perEye(Supplier<T> measure) {
        return new PerEye<>(maybe(measure), maybe(measure));
    }

    private <T> @Nullable T maybe(Supplier<T> measure) {
        return random.nextInt(4) == 0 ? null : measure.get();
    }

    private double hundredths(int least, int most) {
        return least + random.nextInt((most - least) * 100 + 1) / 100.0;
    }

    @SafeVarargs
    private <T> T pick(T... values) {
        return values[random.nextInt(values.length)];
    }
}
