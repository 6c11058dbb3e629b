package plusward.rules;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import plusward.optics.Quantity;

/** Writes the document of the rules: a section for each code in the order of the book, between a head and a tail that are kept as text. */
final class RulesDocument {

    static final Path FILE = Path.of("docs/rules.md");
    static final Path SOURCES = Path.of("docs/sources.md");

    private static final Path PARTS = Path.of("src/test/java/plusward/rules");
    private static final Set<String> WITH_LADDER = Set.of("turn-not-held", "control-lost");
    private static final String LADDER =
            "[The list](#what-to-rule-out-when-the-turn-is-not-held) at the end of this page.";

    private RulesDocument() {}

    static String text() throws IOException {
        StringBuilder text = new StringBuilder(part("rules-head.md"));
        for (Rule rule : byCode().values()) {
            text.append(section(rule));
        }
        return text + part("rules-tail.md");
    }

    /** A part that is written by hand. */
    static String part(String name) throws IOException {
        return Files.readString(PARTS.resolve(name));
    }

    /** As {@code ## 1 · pedig-2009} is linked to. */
    static String anchor(Source source) throws IOException {
        return Pattern.compile("(?m)^## (\\d+) · " + Pattern.quote(source.id()) + "$")
                .matcher(Files.readString(SOURCES))
                .results()
                .map(match -> match.group(1) + "--" + source.id())
                .findFirst()
                .orElseThrow();
    }

    /** The rules that share a code say the same of themselves; the first stands for all. */
    private static Map<String, Rule> byCode() {
        Map<String, Rule> rules = new LinkedHashMap<>();
        Rulebook.rules().forEach(rule -> rules.putIfAbsent(rule.code(), rule));
        return rules;
    }

    private static String section(Rule rule) throws IOException {
        String code = rule.code();
        List<String> lines = new ArrayList<>();
        lines.add("\n## " + said(code, "title") + "\n\n" + said(code, "rule") + "\n");
        lines.add("- **In data**: `" + code + "`");
        lines.add("- **Weight**: " + rule.weights().stream().map(Weight::code).collect(Collectors.joining(" or ")));
        add(lines, limitLabel(code), limits(code));
        add(lines, "Check first", WITH_LADDER.contains(code) ? LADDER : checks(code));
        add(lines, "Undecided", undecided(code));
        lines.add("- **Source**: [" + rule.source().citation() + "](sources.md#" + anchor(rule.source()) + ")");
        return String.join("\n", lines) + "\n";
    }

    private static void add(List<String> lines, String label, String text) {
        if (!text.isEmpty()) {
            lines.add("- **" + label + "**: " + text);
        }
    }

    private static String limitLabel(String code) {
        return said(code, "rule").contains("clinic") ? "Limit by default" : "Limit";
    }

    /** The limits that findings were measured by, as far as the rule's own sentence does not name them. */
    private static String limits(String code) {
        return Told.met()
                .filter(met -> met.code().equals(code))
                .map(met -> met.evidence().get("limit"))
                .filter(Quantity.class::isInstance)
                .map(limit -> (Quantity<?>) limit)
                .filter(limit -> limit.amount() != 0)
                .map(limit -> new Size(limit).toString())
                .filter(limit -> !said(code, "rule").contains(limit))
                .distinct()
                .sorted()
                .collect(Collectors.joining(" or "));
    }

    private static String checks(String code) {
        return Stream.iterate(1, i -> i + 1)
                .map(i -> "finding." + code + ".check." + i)
                .takeWhile(Worded::has)
                .map(Worded::message)
                .collect(Collectors.joining(" "));
    }

    /** In words that fit any visit: the sentence of the finding itself, unless that one names a reading or a day. */
    private static String undecided(String code) {
        return Stream.of("undecided", "missing")
                .filter(part -> Worded.has("finding." + code + "." + part))
                .map(part -> said(code, part))
                .findFirst()
                .orElse("");
    }

    private static String said(String code, String part) {
        return Worded.message("finding." + code + "." + part);
    }
}
