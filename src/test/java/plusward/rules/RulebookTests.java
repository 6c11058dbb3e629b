package plusward.rules;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.MatchResult;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import plusward.course.Limits;
import plusward.exam.TurnCondition;

/** The rulebook as a whole: every rule is listed, worded, sourced and tested, and the document of the rules is up to date. */
class RulebookTests {

    private static final Path MAIN = Path.of("src/main/java/plusward/rules");
    private static final Path TESTS = Path.of("src/test/java/plusward/rules");

    /** A whole key between quotation marks. */
    private static final Pattern KEY = Pattern.compile(
            "\"((?:eyes|sentences|finding|lens-fault|segment|change|missing|ladder|suspicion)\\.[a-z.-]*[a-z])\"");

    /** Said by no finding: the names on the screen, and what the document of the rules needs. */
    private static final Pattern NAMES =
            Pattern.compile("finding\\.[a-z-]+\\.(title|rule|undecided)|weight\\.[a-z]+|evidence\\.\\w+");

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
        assertThat(Rulebook.rules().stream()
                        .filter(rule -> !(rule instanceof ChangeRule))
                        .map(Rule::code))
                .doesNotHaveDuplicates()
                .doesNotContain("real-change", "within-noise");
    }

    @Test
    void aChangeIsListedOnceForEachReadingWithGlassesAndAnswer() {
        List<TurnCondition> withGlasses =
                List.of(TurnCondition.CC_DISTANCE, TurnCondition.CC_NEAR, TurnCondition.ADD_NEAR);
        assertThat(Rulebook.rules().stream().filter(ChangeRule.class::isInstance))
                .containsExactlyInAnyOrderElementsOf(withGlasses.stream()
                        .flatMap(each -> Stream.of(new ChangeRule(each, true), new ChangeRule(each, false)))
                        .toList());
    }

    @ParameterizedTest
    @EnumSource
    void everySourceHasItsEntryWithItsCitationInTheListOfSources(Source source) throws IOException {
        assertThat(words(entry(source))).containsAll(words(source.citation()));
    }

    @Test
    void everySourceIsOfARuleAndItsEntryNamesThatRule() throws IOException {
        assertThat(Rulebook.rules().stream().map(Rule::source)).contains(Source.values());
        for (Rule rule : Rulebook.rules()) {
            if (rule.source() != Source.COMMON_PRACTICE) {
                assertThat(entry(rule.source())).contains("`" + rule.code() + "`");
            }
        }
    }

    @ParameterizedTest
    @MethodSource("codes")
    void everyRuleHasItsSentences(String code) {
        assertThat(List.of("title", "rule", "met", "not"))
                .allSatisfy(part -> assertThat(Worded.message("finding." + code + "." + part))
                        .isNotBlank());
    }

    @ParameterizedTest
    @MethodSource("codes")
    void aRuleSaysWhatIsMissingWhenItCanBeUndecided(String code) {
        assertThat(Worded.has("finding." + code + ".missing"))
                .isEqualTo(Told.undecidedCodes().contains(code));
    }

    /** There is English only so far; another language is a further bundle and must say as much. */
    @Test
    void everySentenceStandsInEveryLanguage() throws IOException {
        assertThat(Worded.languagesOfFindings())
                .hasSizeGreaterThan(0)
                .allSatisfy(bundle -> assertThat(Worded.keys(bundle)).as(bundle).isEqualTo(Worded.keys("findings")));
    }

    @Test
    void everyKeyOfThePackageHasAMessageAndEveryMessageIsSaid() throws IOException {
        Set<String> said = keysOfThePackage();
        said.addAll(Told.keys());
        assertThat(said).allMatch(Worded::has);
        assertThat(Worded.keys("findings").stream()
                        .filter(key -> !said.contains(key))
                        .filter(key -> !NAMES.matcher(key).matches()))
                .isEmpty();
    }

    @Test
    void everyNameIsOfACodeOrAWeight() {
        Set<String> names = Stream.concat(
                        codes().stream()
                                .flatMap(code -> Stream.of("title", "rule", "undecided")
                                        .map(part -> "finding." + code + "." + part)),
                        Stream.of(Weight.values()).map(weight -> "weight." + weight.code()))
                .collect(Collectors.toSet());
        assertThat(Worded.keys("findings").stream()
                        .filter(key -> NAMES.matcher(key).matches())
                        .filter(key -> !key.startsWith("evidence.")))
                .isSubsetOf(names)
                .contains("weight.act", "weight.look", "weight.note");
    }

    @Test
    void everyNumberBehindAFindingHasItsName() {
        assertThat(Told.met().flatMap(met -> met.evidence().keySet().stream()).map(name -> "evidence." + name))
                .hasSameElementsAs(Worded.keys("findings").stream()
                        .filter(key -> key.startsWith("evidence."))
                        .toList());
    }

    @ParameterizedTest
    @MethodSource("codes")
    void theWeightsOfARuleAreThoseThatItsFindingsHave(String code) {
        List<Weight> met = Told.met()
                .filter(each -> each.code().equals(code))
                .map(Finding.Met::weight)
                .distinct()
                .sorted()
                .toList();
        assertThat(met).isNotEmpty();
        assertThat(Rulebook.rules().stream().filter(rule -> rule.code().equals(code)))
                .allSatisfy(rule -> assertThat(rule.weights()).isEqualTo(met));
    }

    /** Run with {@code -Drules.md=write} to bring it up to date. */
    @Test
    void theDocumentOfTheRulesIsUpToDate() throws IOException {
        String document = RulesDocument.text();
        if ("write".equals(System.getProperty("rules.md"))) {
            Files.writeString(RulesDocument.FILE, document);
        }
        assertThat(Files.readString(RulesDocument.FILE))
                .as("docs/rules.md; to bring it up to date run this test with -Drules.md=write")
                .isEqualTo(document);
    }

    @Test
    void theDocumentOfTheRulesHasNoGapAndNamesOnlyRulesOfTheBook() throws IOException {
        String document = RulesDocument.text();
        assertThat(document).doesNotContain("{", "}", "null");
        assertThat(Pattern.compile("`([a-z-]+)`").matcher(document).results().map(match -> match.group(1)))
                .hasSameElementsAs(codes());
        assertThat(RulesDocument.part("rules-tail.md")).contains(Limits.DEFAULT.settleWeeks() + " weeks");
    }

    static Set<String> codes() {
        return Rulebook.rules().stream().map(Rule::code).collect(Collectors.toCollection(LinkedHashSet::new));
    }

    /** The section of a source, heading included. */
    private static String entry(Source source) throws IOException {
        Matcher entry = Pattern.compile("(?ms)^## \\d+ · " + Pattern.quote(source.id()) + "$.*?(?=^## |\\z)")
                .matcher(Files.readString(RulesDocument.SOURCES));
        assertThat(entry.find()).as(source.id()).isTrue();
        return entry.group();
    }

    private static List<String> words(String text) {
        return List.of(text.toLowerCase(Locale.ROOT).split("[^\\p{L}\\d]+"));
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
