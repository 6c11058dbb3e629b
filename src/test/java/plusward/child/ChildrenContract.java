package plusward.child;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.LocalDate;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.jpa.test.autoconfigure.TestEntityManager;
import org.springframework.context.annotation.Import;
import org.springframework.dao.DataIntegrityViolationException;
import org.springframework.dao.OptimisticLockingFailureException;
import org.springframework.jdbc.core.JdbcTemplate;
import org.springframework.transaction.annotation.Transactional;

/** What the register of children must hold on every database. */
@Import(Children.class)
@Transactional
abstract class ChildrenContract {

    private static final LocalDate BORN = LocalDate.parse("2019-05-02");

    @Autowired
    Children children;

    @Autowired
    TestEntityManager persistence;

    @Autowired
    JdbcTemplate database;

    private static ChildDetails details(String number, @Nullable String given, @Nullable String family) {
        return new ChildDetails(number, given, family, BORN, 30, "es", "two\nlines");
    }

    private List<String> numbersFound(String text) {
        return children.search(text, 0).map(ChildCard::clinicNumber).getContent();
    }

    @Test
    void aChildComesBackAsItWasRegistered() {
        ChildCard added = children.add(details("A-1", "Nell", "Farthingale"));
        persistence.clear();
        assertThat(children.find(added.id())).contains(added);
        assertThat(children.findByClinicNumber("A-1")).contains(added);
        assertThat(children.withClinicNumbers(List.of("A-1", "A-2"))).containsOnlyKeys("A-1");
        assertThat(added.details()).isEqualTo(details("A-1", "Nell", "Farthingale"));
        assertThat(added.patient().bornOn()).isEqualTo(BORN);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', nullValues = "-", textBlock = """
        # given | family      | shown            | listed
        Nell    | Farthingale | Nell Farthingale | Farthingale, Nell
        Nell    | -           | Nell             | Nell
        -       | Farthingale | Farthingale      | Farthingale
        -       | -           | A-1              | A-1
        """)
    void aChildIsCalledByWhatIsKnownOfItsName(String given, String family, String shown, String listed) {
        ChildCard child = children.add(details("A-1", given, family));
        assertThat(child.shownName()).isEqualTo(shown);
        assertThat(child.listedName()).isEqualTo(listed);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
        # typed            | found
        farth              | B-10
        NELL FARTHINGALE   | B-10
        farthingale, nell  | B-10
        b-1                | B-10 B-1_2
        b-1_               | B-1_2
        %                  | ''
        2019-05-02         | B-10 B-1_2
        2019-05            | ''
        ''                 | B-10 B-1_2
        """)
    void findsByPartOfANameOrNumberOrByTheDayOfBirth(String typed, String found) {
        database.update(
                "insert into child (id, version, created_at, changed_at, clinic_number, family_name, born_on, handout_language)"
                        + " values (1, 0, now(), now(), 'B-1_2', 'Zander', date '2019-05-02', 'en')");
        children.add(details("B-10", "Nell", "Farthingale"));
        assertThat(String.join(" ", numbersFound(typed))).isEqualTo(found);
    }

    @Test
    void findsNothingButNeverFailsForAnyText() {
        assertThat(numbersFound("\u0000'; drop table child; --\n!%_\\")).isEmpty();
        assertThat(numbersFound("x".repeat(100_000))).isEmpty();
        assertThat(children.search("", 100_000).getContent()).isEmpty();
    }

    @Test
    void showsFiftyOnAPageByFamilyName() {
        for (int i = 0; i < 51; i++) {
            children.add(details("N-" + i, null, "Family" + (char) ('a' + i % 26) + i));
        }
        assertThat(children.search("N-", 0).getContent())
                .hasSize(50)
                .extracting(card -> card.listedName().toLowerCase(Locale.ROOT))
                .isSorted();
        assertThat(children.search("N-", 1).getContent()).hasSize(1);
        assertThat(children.all()).hasSize(51);
    }

    @Test
    void aClinicNumberIsGivenOnce() {
        children.add(details("A-1", null, null));
        assertThatThrownBy(() -> children.add(details("A-1", null, null)))
                .isInstanceOf(DataIntegrityViolationException.class);
    }

    @Test
    void aCorrectionOfAnOlderStateIsRefused() {
        ChildCard child = children.add(details("A-1", null, "Before"));
        ChildCard corrected = children.update(child.id(), child.version(), details("A-1", null, "After"));
        assertThat(corrected.version()).isGreaterThan(child.version());
        assertThatThrownBy(() -> children.update(child.id(), child.version(), details("A-1", null, "Late")))
                .isInstanceOf(OptimisticLockingFailureException.class);
        persistence.clear();
        assertThat(children.find(child.id()).orElseThrow().familyName()).isEqualTo("After");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"", " ", "A 1", "A-1 ", "A\u00001", "=A1", "A-123456789012345678901", "A_1", "A?1", "A\u202e1"})
    void aClinicNumberIsPlain(String number) {
        assertThatIllegalArgumentException().isThrownBy(() -> details(number, null, null));
    }

    @ParameterizedTest
    @ValueSource(strings = {"1", "A-1007", "2019/114.b", "Ä-7", "12345678901234567890"})
    void aClinicNumberHasUpToTwentyLettersDigitsDotsDashesAndSlashes(String number) {
        assertThat(children.add(details(number, null, null)).clinicNumber()).isEqualTo(number);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "born_on = date '1899-12-31'",
                "born_on = date '2200-01-01'",
                "turn_first_seen_months = -1",
                "turn_first_seen_months = 217",
                "handout_language = 'fr'",
                "clinic_number = ''",
                "clinic_number = ' A-1'"
            })
    void theDatabaseItselfRefusesNonsense(String nonsense) {
        ChildCard child = children.add(details("A-1", null, null));
        assertThatThrownBy(() -> database.update("update child set " + nonsense + " where id = ?", child.id()))
                .isInstanceOf(DataIntegrityViolationException.class);
    }
}
