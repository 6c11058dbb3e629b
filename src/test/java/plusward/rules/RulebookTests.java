package plusward.rules;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import plusward.course.Course;
import plusward.course.Demonstration;
import plusward.course.Limits;
import plusward.course.RandomCourses;
import plusward.course.Story;

/** The rulebook as a whole: every rule is listed, worded, sourced and tested, and the document of the rules is up to date. */
class RulebookTests {

    private static final Path MAIN = Path.of("src/main/java/plusward/rules");
    private static final Path TESTS = Path.of("src/test/java/plusward/rules");
    private static final Path DOCUMENT = Path.of("docs/rules.md");
    private static final Path SOURCES = Path.of("docs/sources.md");

    /** A whole key between quotation marks. */
    private static final Pattern KEY = Pattern.compile(
            "\"((?:eyes|sentences|finding|lens-fault|segment|change|missing|ladder|suspicion)\\.[a-z.-]*[a-z])\"");

    /** Keys that are put together from the code of a rule, of a weight or of an answer. */
    private static final Pattern BUILT = Pattern.compile(
            "finding\\.(CODES)\\.(title|rule|met|not|missing|check\\.[1-9])|weight\\.(act|look|note)|evidence\\.\\w+"
                    .replace("CODES", String.join("|", codes())));

    @Test
    void everyRuleOfThePackageIsListed() throws IOException {
        Set<String> listed = Rulebook.rules().stream()
                .map(rule -> rule.getClass().getSimpleName())
                .collect(Collectors.toCollection(TreeSet::new));
        assertThat(listed).isEqualTo(new TreeSet<>(rulesOfThePackage()));
    }

    @Test
    void everyRuleHasItsTests() throws IOException {
        assertThat(rulesOfThePackage())
                .allSatisfy(
                        rule -> assertThat(TESTS.resolve(rule + "Tests.java")).exists());
    }

    @Test
    void noCodeIsListedTwiceExceptForTheReadingsOfAChange() {
        List<String> others = Rulebook.rules().stream()
                .filter(rule -> !(rule instanceof ChangeRule))
                .map(Rule::code)
                .toList();
        assertThat(others).doesNotHaveDuplicates();
        assertThat(Rulebook.rules().stream()
                        .filter(ChangeRule.class::isInstance)
                        .map(Rule::code))
                .containsOnly("real-change", "within-noise");
    }

    @ParameterizedTest
    @EnumSource
    void everySourceHasItsEntryInTheListOfSources(Source source) throws IOException {
        assertThat(Files.readString(SOURCES)).containsPattern("(?m)^## \\d+ · " + Pattern.quote(source.id()) + "$");
        assertThat(source.citation()).isNotBlank();
    }

    @ParameterizedTest
    @MethodSource("codes")
    void everyRuleHasItsSentences(String code) {
        assertThat(List.of("title", "rule", "met", "not", "missing"))
                .allSatisfy(part -> assertThat(Worded.message("finding." + code + "." + part))
                        .isNotNull());
    }

    @Test
    void everyKeyOfThePackageHasAMessageAndEveryMessageIsUsed() throws IOException {
        Set<String> used = keysOfThePackage();
        assertThat(used.stream().filter(key -> !Worded.has(key))).isEmpty();
        assertThat(Worded.findings().stream()
                        .filter(key -> !BUILT.matcher(key).matches())
                        .filter(key -> !used.contains(key))
                        .filter(key -> !isBuiltFromANamedPart(key)))
                .isEmpty();
    }

    /** Keys such as {@code finding.not-applicable.} or {@code ladder.answer.}, to which the code adds a name. */
    private static boolean isBuiltFromANamedPart(String key) {
        return Stream.of(
                        "finding.not-applicable.",
                        "ladder.answer.",
                        "lens-fault.",
                        "finding.sudden-larger-turn.",
                        "finding.hyperopia-falling.")
                .anyMatch(key::startsWith);
    }

    @Test
    void everyNumberBehindAFindingHasItsName() {
        Set<String> names = met().flatMap(met -> met.evidence().keySet().stream())
                .map(name -> "evidence." + name)
                .collect(Collectors.toCollection(TreeSet::new));
        Set<String> worded = Worded.findings().stream()
                .filter(key -> key.startsWith("evidence."))
                .collect(Collectors.toCollection(TreeSet::new));
        assertThat(names).isEqualTo(worded);
    }

    @Test
    void everyCodeIsMetInATestedCourse() {
        assertThat(met().map(Finding.Met::code).collect(Collectors.toSet()))
                .containsExactlyInAnyOrderElementsOf(codes());
    }

    /** Run with {@code -Drules.md=write} to bring it up to date. */
    @Test
    void theDocumentOfTheRulesIsUpToDate() throws IOException {
        String document = document();
        if ("write".equals(System.getProperty("rules.md"))) {
            Files.writeString(DOCUMENT, document);
        }
        assertThat(Files.readString(DOCUMENT))
                .as("docs/rules.md; to bring it up to date run this test with -Drules.md=write")
                .isEqualTo(document);
    }

    static Set<String> codes() {
        return Rulebook.rules().stream().map(Rule::code).collect(Collectors.toCollection(LinkedHashSet::new));
    }

    private static String document() throws IOException {
        Map<String, Set<Weight>> weights = new TreeMap<>();
        met().forEach(met -> weights.computeIfAbsent(met.code(), code -> EnumSet.noneOf(Weight.class))
                .add(met.weight()));
        StringBuilder text = new StringBuilder(Files.readString(TESTS.resolve("rules-head.md")));
        Set<String> written = new LinkedHashSet<>();
        for (Rule rule : Rulebook.rules()) {
            if (written.add(rule.code())) {
                text.append(section(rule, weights.get(rule.code())));
            }
        }
        return text + Files.readString(TESTS.resolve("rules-tail.md"));
    }

    private static String section(Rule rule, Set<Weight> weights) throws IOException {
        String code = rule.code();
        List<String> lines = new ArrayList<>();
        lines.add("\n## " + code);
        lines.add("\n**" + said(code, "title") + ".** " + said(code, "rule"));
        lines.add("\n- Weight: " + weights.stream().map(Weight::code).collect(Collectors.joining(" or ")));
        List<String> checks = checks(code);
        if (!checks.isEmpty()) {
            lines.add("- Check first: " + String.join(" ", checks));
        } else if (code.equals("turn-not-held") || code.equals("control-lost")) {
            lines.add("- Check first: [the ladder](#what-to-rule-out-when-the-turn-is-not-held)");
        }
        lines.add("- Source: [" + rule.source().citation() + "](sources.md#" + anchor(rule.source()) + ")");
        return String.join("\n", lines) + "\n";
    }

    private static String said(String code, String part) {
        return Worded.message("finding." + code + "." + part);
    }

    private static List<String> checks(String code) {
        return Stream.iterate(1, i -> i + 1)
                .map(i -> "finding." + code + ".check." + i)
                .takeWhile(Worded::has)
                .map(Worded::message)
                .toList();
    }

    /** As a heading {@code ## 1 · pedig-2009} is linked to. */
    private static String anchor(Source source) throws IOException {
        return Pattern.compile("(?m)^## (\\d+) · " + Pattern.quote(source.id()) + "$")
                .matcher(Files.readString(SOURCES))
                .results()
                .map(match -> match.group(1) + "--" + source.id())
                .findFirst()
                .orElseThrow();
    }

    /** Everything that is met in the stories, the demonstration clinic and random courses, also when a visit is overdue. */
    private static Stream<Finding.Met> met() {
        Stream<Course> told =
                Stream.concat(Story.all().stream().map(Story::course), Demonstration.courses().values().stream());
        return Stream.concat(told, RandomCourses.all().stream())
                .flatMap(course -> course.visits().stream())
                .flatMap(visit -> Stream.of(0, 40, 400)
                        .flatMap(days -> Rulebook.met(visit, visit.date().plusDays(days), Limits.DEFAULT).stream()));
    }

    private static List<String> rulesOfThePackage() throws IOException {
        return classesOfThePackage().stream()
                .filter(Rule.class::isAssignableFrom)
                .filter(type -> !type.isInterface() && !isPartOfAnother(type))
                .map(Class::getSimpleName)
                .toList();
    }

    /** A sudden larger turn has three conditions, each a class of its own. */
    private static boolean isPartOfAnother(Class<?> type) {
        return SuddenTurn.class.isAssignableFrom(type) && type != SuddenLargerTurn.class;
    }

    private static List<Class<?>> classesOfThePackage() throws IOException {
        try (Stream<Path> files = Files.list(MAIN)) {
            return files.map(file -> file.getFileName().toString().replace(".java", ""))
                    .filter(name -> !name.equals("package-info"))
                    .sorted()
                    .<Class<?>>map(RulebookTests::load)
                    .toList();
        }
    }

    private static Class<?> load(String name) {
        try {
            return Class.forName("plusward.rules." + name);
        } catch (ClassNotFoundException missing) {
            throw new IllegalStateException(missing);
        }
    }

    private static Set<String> keysOfThePackage() throws IOException {
        Set<String> keys = new TreeSet<>();
        try (Stream<Path> files = Files.list(MAIN)) {
            for (Path file : files.toList()) {
                keys.addAll(KEY.matcher(Files.readString(file))
                        .results()
                        .map((MatchResult match) -> match.group(1))
                        .collect(Collectors.toSet()));
            }
        }
        return keys;
    }
}
