package plusward;

import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.core.domain.JavaCall.Predicates.target;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.core.domain.properties.HasName.Predicates.name;
import static com.tngtech.archunit.core.domain.properties.HasOwner.Predicates.With.owner;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import jakarta.persistence.Embeddable;
import jakarta.persistence.Entity;
import java.time.Clock;
import java.util.Arrays;
import java.util.Locale;
import java.util.stream.Stream;
import org.springframework.boot.context.properties.ConfigurationProperties;
import org.springframework.context.annotation.Configuration;
import org.springframework.data.repository.Repository;
import org.springframework.stereotype.Controller;

/** Who may import whom, a line a package, and what every package keeps to itself. */
@AnalyzeClasses(packages = "plusward", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTests {

    private static final String[] CORE = {"optics", "exam", "course", "rules"};
    private static final String[] CORE_AND_WEB = {"optics", "exam", "course", "rules", "web"};

    @ArchTest
    static final ArchRule OPTICS = only("optics");

    @ArchTest
    static final ArchRule EXAM = only("exam", "optics");

    @ArchTest
    static final ArchRule COURSE = only("course", "exam", "optics");

    @ArchTest
    static final ArchRule RULES = only("rules", "course", "exam", "optics");

    @ArchTest
    static final ArchRule WEB = only("web", "optics", "exam");

    @ArchTest
    static final ArchRule PEOPLE = only("people", "web");

    @ArchTest
    static final ArchRule CHILD = feature("child");

    @ArchTest
    static final ArchRule VISIT = feature("visit", "child");

    @ArchTest
    static final ArchRule DRAFT = feature("draft");

    @ArchTest
    static final ArchRule READBACK = feature("readback");

    @ArchTest
    static final ArchRule ENTRY = feature("entry", "readback", "draft", "visit", "child");

    @ArchTest
    static final ArchRule PHOTO = feature("photo");

    @ArchTest
    static final ArchRule REVIEW = feature("review", "visit", "child");

    @ArchTest
    static final ArchRule HANDOUT = feature("handout", "visit", "child");

    @ArchTest
    static final ArchRule RECALL = feature("recall", "draft", "visit", "child");

    @ArchTest
    static final ArchRule EXCHANGE = feature("exchange", "visit", "child");

    @ArchTest
    static final ArchRule LISTED = classes()
            .should()
            .resideInAnyPackage(Stream.concat(
                            Stream.of("plusward"),
                            Stream.of(
                                            "optics",
                                            "exam",
                                            "course",
                                            "rules",
                                            "web",
                                            "people",
                                            "child",
                                            "visit",
                                            "draft",
                                            "readback",
                                            "entry",
                                            "photo",
                                            "review",
                                            "handout",
                                            "recall",
                                            "exchange")
                                    .map(ArchitectureTests::named))
                    .toArray(String[]::new))
            .because("every package is flat and has its line here; a package that outgrows itself becomes two features,"
                    + " each with a line of its own");

    @ArchTest
    static final ArchRule NO_CYCLES = slices().matching("plusward.(*)..")
            .should()
            .beFreeOfCycles()
            .because("data flows one way; move what both need into the lower of the two packages");

    @ArchTest
    static final ArchRule PLAIN_CORE = noClasses()
            .that(areCore())
            .should()
            .dependOnClassesThat(not(resideInAnyPackage(
                    "plusward..",
                    "java.lang",
                    "java.lang.runtime",
                    "java.lang.invoke",
                    "java.util",
                    "java.util.function",
                    "java.util.regex",
                    "java.util.stream",
                    "java.math",
                    "java.time..",
                    "org.jspecify..",
                    "org.hipparchus..")))
            .because(
                    "the core is plain Java; do the input, output, storing and logging in a feature, and hand values in")
            .allowEmptyShould(true);

    @ArchTest
    static final ArchRule CORE_WITHOUT_CLOCK = noClasses()
            .that(areCore())
            .should()
            .dependOnClassesThat()
            .areAssignableTo(Clock.class)
            .orShould()
            .callMethodWhere(target(name("now")).and(target(owner(resideInAPackage("java.time..")))))
            .orShould()
            .callMethod(System.class, "currentTimeMillis")
            .orShould()
            .callMethod(System.class, "nanoTime")
            .because("the core does not know today; take the date as a parameter from the feature, which has the Clock")
            .allowEmptyShould(true);

    @ArchTest
    static final ArchRule CORE_WITHOUT_LOCALE = noClasses()
            .that(areCore())
            .should()
            .callMethod(String.class, "format", String.class, Object[].class)
            .orShould()
            .callMethod(String.class, "formatted", Object[].class)
            .orShould()
            .callMethod(String.class, "toLowerCase")
            .orShould()
            .callMethod(String.class, "toUpperCase")
            .orShould()
            .callMethod(Locale.class, "getDefault")
            .because(
                    "the notation of the trade is the same everywhere; name Locale.ROOT, and let web.Shown do the rest")
            .allowEmptyShould(true);

    @ArchTest
    static final ArchRule ROOMS_ARE_CLOSED = noClasses()
            .that()
            .areAnnotatedWith(Controller.class)
            .or()
            .areMetaAnnotatedWith(Controller.class)
            .or()
            .areAnnotatedWith(Entity.class)
            .or()
            .areAnnotatedWith(Embeddable.class)
            .or()
            .areAnnotatedWith(ConfigurationProperties.class)
            .or()
            .areAnnotatedWith(Configuration.class)
            .or()
            .areAssignableTo(Repository.class)
            .or()
            .haveSimpleNameEndingWith("Form")
            .or()
            .haveSimpleNameEndingWith("Page")
            .should()
            .bePublic()
            .because("a feature is entered by its one public door; drop the modifier and offer what others need there")
            .allowEmptyShould(true);

    @ArchTest
    static final ArchRule PLAIN_NAMES = noClasses()
            .should()
            .haveNameMatching(".*(Manager|Helper|Util|Utils|Impl|Dto|DTO)")
            .because("such a name says nothing; name it after what it knows or does");

    @ArchTest
    static final ArchRule CONSTRUCTORS_NOT_FIELDS = noClasses()
            .should()
            .dependOnClassesThat()
            .haveFullyQualifiedName("org.springframework.beans.factory.annotation.Autowired")
            .because("what a class needs stands in its constructor; a single constructor needs no annotation")
            .allowEmptyShould(true);

    /** The feature's own line: the core, the shell, and the features below it that it names. */
    private static ArchRule feature(String name, String... below) {
        return only(
                name,
                Stream.concat(Arrays.stream(CORE_AND_WEB), Arrays.stream(below)).toArray(String[]::new));
    }

    private static ArchRule only(String name, String... allowed) {
        String[] reachable = Stream.concat(Stream.of(name), Arrays.stream(allowed))
                .map(ArchitectureTests::named)
                .toArray(String[]::new);
        return noClasses()
                .that()
                .resideInAPackage(named(name))
                .should()
                .dependOnClassesThat(resideInAPackage("plusward..").and(not(resideInAnyPackage(reachable))))
                .because(name + " may import "
                        + (allowed.length == 0 ? "no other package of ours" : "only " + String.join(", ", allowed))
                        + "; move what it needs down into one of them, or let a package above bring the two together")
                .allowEmptyShould(true);
    }

    private static DescribedPredicate<JavaClass> areCore() {
        return resideInAnyPackage(
                Arrays.stream(CORE).map(ArchitectureTests::named).toArray(String[]::new));
    }

    private static String named(String name) {
        return "plusward." + name;
    }
}
