package plusward.draft;

import static org.assertj.core.api.Assertions.assertThat;

import java.sql.Timestamp;
import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import java.util.concurrent.CyclicBarrier;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.autoconfigure.ImportAutoConfiguration;
import org.springframework.boot.jackson.autoconfigure.JacksonAutoConfiguration;
import org.springframework.context.annotation.Import;
import org.springframework.jdbc.core.JdbcTemplate;
import org.springframework.security.authentication.TestingAuthenticationToken;
import org.springframework.security.core.context.SecurityContextHolder;
import org.springframework.transaction.annotation.Propagation;
import org.springframework.transaction.annotation.Transactional;
import plusward.child.ChildDetails;
import plusward.child.Children;
import plusward.exam.Field;

/** What keeping drafts must hold on every database; without a transaction around it, as the pages call it. */
@Import({Children.class, Drafts.class})
@ImportAutoConfiguration(JacksonAutoConfiguration.class)
@Transactional(propagation = Propagation.NOT_SUPPORTED)
abstract class DraftsContract {

    private static final LocalDate DAY = LocalDate.parse("2026-03-09");
    private static final Map<Field, String> TYPED = Map.of(Field.VISIT_DATE, "2026-03-09", Field.TURN_CC_NEAR, "ET 1x");

    @Autowired
    Children children;

    @Autowired
    Drafts drafts;

    @Autowired
    JdbcTemplate database;

    private Draft.Place fresh;
    private Draft.Place correction;
    private Draft.Place otherChild;

    private static void signIn(String name) {
        SecurityContextHolder.getContext().setAuthentication(new TestingAuthenticationToken(name, "", "ROLE_STAFF"));
    }

    private long child(String number) {
        return children.add(new ChildDetails(number, "Mara", "Ellwood", LocalDate.parse("2019-05-02"), 30, "en", null))
                .id();
    }

    @BeforeEach
    void twoChildrenAndAnAccount() {
        signIn("r.tamsin");
        long child = child("A-1");
        fresh = new Draft.Place(child, Draft.NEW, DAY);
        correction = new Draft.Place(child, 70, DAY);
        otherChild = new Draft.Place(child("A-2"), Draft.NEW, DAY);
    }

    @AfterEach
    void nothingIsLeft() {
        SecurityContextHolder.clearContext();
        database.update("delete from draft");
        database.update("delete from child");
    }

    private boolean keep(Draft.Place place, Map<Field, String> typed) {
        return drafts.keep(place, 0, "", typed);
    }

    private Map<Field, String> typedAt(Draft.Place place) {
        return drafts.find(place).orElseThrow().typed();
    }

    @Test
    void aDraftComesBackAsItWasKept() {
        Instant before = Instant.now().minusMillis(1);
        assertThat(drafts.keep(correction, 3, "read twice", TYPED)).isTrue();
        Draft found = drafts.find(correction).orElseThrow();
        assertThat(found.place()).isEqualTo(correction);
        assertThat(found.version()).isEqualTo(3);
        assertThat(found.why()).isEqualTo("read twice");
        assertThat(found.typed()).isEqualTo(TYPED);
        assertThat(found.keptAt()).isBetween(before, Instant.now().plusMillis(1));
    }

    @Test
    void keepingAgainReplacesAllOfIt() {
        drafts.keep(correction, 3, "read twice", TYPED);
        drafts.keep(correction, 4, "typed wrong", Map.of(Field.WEAR_HOURS, "12"));
        assertThat(drafts.mine()).singleElement().satisfies(draft -> {
            assertThat(draft.version()).isEqualTo(4);
            assertThat(draft.why()).isEqualTo("typed wrong");
            assertThat(draft.typed()).isEqualTo(Map.of(Field.WEAR_HOURS, "12"));
        });
    }

    @Test
    void whatIsBlankIsNotKept() {
        keep(fresh, Map.of(Field.WEAR_HOURS, " ", Field.NOTE, "", Field.PD_MM, " 52 "));
        assertThat(typedAt(fresh)).isEqualTo(Map.of(Field.PD_MM, " 52 "));
    }

    @Test
    void eachChildVisitAndDayHasADraftOfItsOwn() {
        Draft.Place otherDay = new Draft.Place(fresh.childId(), Draft.NEW, DAY.plusDays(1));
        List<Draft.Place> places = List.of(fresh, correction, otherDay, otherChild);
        places.forEach(place -> keep(place, Map.of(Field.NOTE, place.toString())));
        assertThat(places)
                .allSatisfy(place -> assertThat(typedAt(place)).isEqualTo(Map.of(Field.NOTE, place.toString())));
        drafts.forget(fresh);
        assertThat(drafts.find(fresh)).isEmpty();
        assertThat(drafts.mine()).extracting(Draft::place).containsExactlyInAnyOrder(correction, otherDay, otherChild);
    }

    @Test
    void theLatestKeptComesFirst() {
        Stream.of(fresh, correction, otherChild).forEach(place -> keep(place, TYPED));
        keptAt(fresh, "2026-03-09T09:00:00Z");
        keptAt(correction, "2026-03-09T11:00:00Z");
        keptAt(otherChild, "2026-03-09T10:00:00Z");
        assertThat(drafts.mine()).extracting(Draft::place).containsExactly(correction, otherChild, fresh);
        assertThat(drafts.mine().get(0).keptAt()).isEqualTo(Instant.parse("2026-03-09T11:00:00Z"));
    }

    private void keptAt(Draft.Place place, String time) {
        database.update(
                "update draft set kept_at = ? where child_id = ? and visit_id = ?",
                Timestamp.from(Instant.parse(time)),
                place.childId(),
                place.visitId());
    }

    @Test
    void anotherAccountSeesNothingOverwritesNothingAndForgetsNothing() {
        keep(fresh, TYPED);
        signIn("d.hale");
        assertThat(drafts.find(fresh)).isEmpty();
        assertThat(drafts.mine()).isEmpty();
        keep(fresh, Map.of(Field.NOTE, "mine"));
        drafts.forget(correction);
        assertThat(typedAt(fresh)).isEqualTo(Map.of(Field.NOTE, "mine"));
        drafts.forget(fresh);
        signIn("r.tamsin");
        assertThat(typedAt(fresh)).isEqualTo(TYPED);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "הערה \u202eabc\u202c שלום",
                "ملاحظة، ٣ نقاط",
                "\"quoted\" 'and' \\ {0} ${1} %s <b>&amp;",
                "two\nlines\r\nand a\ttab",
                "😀 👩‍👧 Δ −0.50 × 180",
                "\u0000\u0007\u001b[31m\u007f\u2028\ufeff",
                ":child; drop table draft; --"
            })
    void everyTextComesBackExactly(String text) {
        assertThat(drafts.keep(correction, 3, text, Map.of(Field.NOTE, text, Field.EXAMINER, text)))
                .isTrue();
        Draft found = drafts.find(correction).orElseThrow();
        assertThat(found.typed()).isEqualTo(Map.of(Field.NOTE, text, Field.EXAMINER, text));
        assertThat(found.why()).isEqualTo(text);
    }

    /** Longer than a correction's reason may be when it is saved, which is said then and must not be lost before. */
    @Test
    void aReasonThatIsTooLongToSaveIsKept() {
        assertThat(drafts.keep(correction, 3, "w".repeat(5000), TYPED)).isTrue();
        assertThat(drafts.find(correction).orElseThrow().why()).hasSize(5000);
    }

    @Test
    void whatIsTooLongIsNotKeptAndLeavesWhatWasKeptBefore() {
        // {"note":"…","why":"…"} has 20 characters beside the two texts
        int most = Drafts.LONGEST - 20;
        assertThat(drafts.keep(fresh, 0, "w", Map.of(Field.NOTE, "n".repeat(most))))
                .isFalse();
        assertThat(drafts.find(fresh)).isEmpty();
        assertThat(drafts.keep(fresh, 0, "w", Map.of(Field.NOTE, "n".repeat(most - 1))))
                .isTrue();
        assertThat(drafts.keep(fresh, 0, "wx", Map.of(Field.NOTE, "n".repeat(most - 1))))
                .isFalse();
        assertThat(keep(fresh, Map.of(Field.NOTE, "n".repeat(1_000_000)))).isFalse();
        assertThat(typedAt(fresh)).isEqualTo(Map.of(Field.NOTE, "n".repeat(most - 1)));
    }

    @Test
    void aColumnThatNoFieldHasIsPassedOver() {
        keep(fresh, TYPED);
        database.update(
                "update draft set typed = ?",
                "{\"shoe_size\":\"28\",\"turn_cc_near\":\"ET 12\",\"NOTE\":\"capitals\"}");
        assertThat(typedAt(fresh)).isEqualTo(Map.of(Field.TURN_CC_NEAR, "ET 12"));
        assertThat(drafts.find(fresh).orElseThrow().why()).isEmpty();
    }

    @Test
    void ofTwoWindowsThatKeepTheirFirstTextAtOnceBothSucceed() throws Exception {
        ExecutorService windows = Executors.newFixedThreadPool(2);
        for (int round = 0; round < 40; round++) {
            CyclicBarrier start = new CyclicBarrier(2);
            List<Future<Boolean>> kept = windows.invokeAll(List.of(window(start, "one"), window(start, "other")));
            assertThat(kept.get(0).get()).isTrue();
            assertThat(kept.get(1).get()).isTrue();
            assertThat(typedAt(fresh)).isIn(Map.of(Field.NOTE, "one"), Map.of(Field.NOTE, "other"));
            drafts.forget(fresh);
        }
        windows.shutdown();
    }

    private Callable<Boolean> window(CyclicBarrier start, String note) {
        return () -> {
            signIn("r.tamsin");
            start.await();
            return keep(fresh, Map.of(Field.NOTE, note));
        };
    }
}
