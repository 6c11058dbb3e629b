package plusward.exchange;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import jakarta.persistence.EntityManagerFactory;
import java.util.List;
import java.util.stream.Collectors;
import org.hibernate.SessionFactory;
import org.hibernate.stat.Statistics;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.dao.DataIntegrityViolationException;
import org.springframework.jdbc.core.simple.JdbcClient;
import plusward.exchange.Outcome.Change;
import plusward.exchange.Outcome.Counts;

/** All or nothing, and the same twice changes nothing, on a real database. */
@WholeClinic
class ImportsTests {

    @Autowired
    Imports imports;

    @Autowired
    JdbcClient database;

    @Autowired
    EntityManagerFactory entities;

    @Test
    void bringsInTheDemonstrationClinicAndASecondTimeChangesNothing() {
        assertThat(imports.bringIn(CsvFiles.seed()).counts()).isEqualTo(new Counts(29 + 231, 0, 0));
        List<String> before = rows();
        assertThat(imports.bringIn(CsvFiles.seed()).counts()).isEqualTo(new Counts(0, 0, 29 + 231));
        assertThat(rows()).hasSize(29 + 231).isEqualTo(before);
    }

    @Test
    void storesNothingByLooking() {
        assertThat(imports.look(CsvFiles.seed()).counts().added()).isEqualTo(29 + 231);
        assertThat(rows()).isEmpty();
    }

    @Test
    void takesAnEmptyCellAsNotMeasuredAndAMissingColumnAsLeftAlone() {
        imports.bringIn(CsvFiles.pair(
                "clinic_number,birth_date,given_name,note\nA-1,2020-01-31,Ann,tall",
                "clinic_number,visit_date,wear_hours,worn_right\nA-1,2024-05-01,12,+3.00"));
        Plan plan = imports.bringIn(CsvFiles.pair(
                "clinic_number,birth_date,note\nA-1,2020-01-31,",
                "clinic_number,visit_date,wear_hours,stereo_arcsec\nA-1,2024-05-01,,100"));
        assertThat(plan.counts()).isEqualTo(new Counts(0, 2, 0));
        assertThat(plan.changes())
                .containsExactly(
                        new Change(CsvKind.CHILDREN, 2, "A-1", "note", "tall", null),
                        new Change(CsvKind.VISITS, 2, "A-1, 2024-05-01", "wear_hours", "12", null),
                        new Change(CsvKind.VISITS, 2, "A-1, 2024-05-01", "stereo_arcsec", null, "100"));
        assertThat(database.sql("select given_name, wear_hours, worn_right_sphere_d, stereo_arcsec, visit.version"
                                + " from child join visit on child_id = child.id")
                        .query()
                        .singleRow()
                        .values())
                .hasToString("[Ann, null, 3.00, 100, 1]");
    }

    @Test
    void leavesWhatIsStoredOfTheOptionalMeasuresWhenTheFileDoesNotHaveThem() {
        imports.bringIn(CsvFiles.pair(
                "clinic_number,birth_date\nA-1,2020-01-31",
                "clinic_number,visit_date,turn_cc_up,turn_cc_left_gaze,ductions,segment_height_right_mm,pupil_height_right_mm\n"
                        + "A-1,2024-05-01,ET 10,ET 20,od abduction,18.5,20"));
        Plan plan = imports.bringIn(
                CsvFiles.pair(null, "clinic_number,visit_date,wear_hours,turn_cc_up\nA-1,2024-05-01,12,"));
        assertThat(plan.changes())
                .containsExactly(
                        new Change(CsvKind.VISITS, 2, "A-1, 2024-05-01", "wear_hours", null, "12"),
                        new Change(CsvKind.VISITS, 2, "A-1, 2024-05-01", "turn_cc_up", "ET 10", null));
        assertThat(database.sql("select gaze, prism_pd, duction_right_abduction, segment_height_right_mm, visit.version"
                                + " from visit join visit_gaze on visit_id = visit.id")
                        .query()
                        .singleRow()
                        .values())
                .hasToString("[LEFT, 20.0, true, 18.50, 1]");
    }

    @Test
    void refusesACellThatIsAtOddsWithWhatIsStored() {
        imports.bringIn(CsvFiles.pair(
                "clinic_number,birth_date\nA-1,2020-01-31",
                "clinic_number,visit_date,segment_height_right_mm,pupil_height_right_mm\nA-1,2024-05-01,18.5,20"));
        String header = "clinic_number,visit_date,segment_right_mm\n";
        assertThat(refusals(imports.bringIn(CsvFiles.pair(null, header + "A-1,2024-05-01,-1.56"))))
                .isEqualTo("visits.csv 2 segment_right_mm");
        assertThat(imports.bringIn(CsvFiles.pair(null, header + "A-1,2024-05-01,-1.55"))
                        .counts())
                .isEqualTo(new Counts(0, 1, 0));
    }

    @Test
    void findsTheSameMeaningInAnotherNotationTheSame() {
        String header = "clinic_number,visit_date,worn_right,turn_cc_near\n";
        imports.bringIn(
                CsvFiles.pair("clinic_number,birth_date\nA-1,2020-01-31", header + "A-1,2024-05-01,+3.50 DS,25Δ ET"));
        Plan plan = imports.bringIn(CsvFiles.pair(null, header.replace(',', ';') + "A-1;2024-05-01;+3.50;ET25"));
        assertThat(plan.counts()).isEqualTo(new Counts(0, 0, 1));
    }

    @Test
    void namesTenPlantedFaultsByRowAndColumnAndStoresNothing() {
        String children = CsvFiles.seed("children.csv")
                .replace("2018-06-14,30", "14.06.2018,30")
                .replace("2019-03-22,33", "2019-03-22,thirty")
                .replace("2020-08-03,36,es", "2020-08-03,36,xx")
                .replace("A-1005,", "A-1004,");
        String visits = plant(CsvFiles.seed("visits.csv"));
        assertThat(refusals(imports.bringIn(CsvFiles.pair(children, visits)))).isEqualTo("""
                children.csv 2 birth_date
                children.csv 3 turn_first_seen_months
                children.csv 4 handout_language
                children.csv 6 clinic_number
                visits.csv 2 turn_sc_near
                visits.csv 3 wear_hours
                visits.csv 4 worn_left
                visits.csv 5 visit_date
                visits.csv 233 visit_date
                visits.csv 234 clinic_number""");
        assertThat(rows()).isEmpty();
    }

    /** Six faults; the visits of A-1005, whom the children's file lost, are given to A-1004 on days of their own. */
    private static String plant(String visits) {
        List<String> rows = visits.lines()
                .map(row -> row.replaceFirst("^A-1005,(\\d{4})-(\\d\\d)-\\d\\d", "A-1004,$1-$2-31"))
                .map(row -> row.replaceFirst("-(02)-31", "-$1-28").replaceFirst("-(04|06|09|11)-31", "-$1-30"))
                .collect(Collectors.toList());
        rows.set(1, rows.get(1).replace("ET' 30", "30"));
        rows.set(2, rows.get(2).replace("Osterlund,12", "Osterlund,25"));
        rows.set(3, rows.get(3).replace("+4.75 -0.50 x 180,,2021", "4.75 -0.50 x 180,,2021"));
        rows.set(4, rows.get(4).replaceFirst("A-1001,[0-9-]+", "A-1001,2999-01-01"));
        rows.add(rows.get(10));
        rows.add(rows.get(11).replaceFirst("A-\\d+", "A-9999"));
        return String.join("\n", rows);
    }

    @Test
    void storesNothingWhenTheDatabaseRefusesInTheMiddle() {
        database.sql("alter table visit add constraint no_such_examiner check (examiner <> 'N. Obody')")
                .update();
        try {
            CsvPair files = CsvFiles.pair(
                    "clinic_number,birth_date\nA-1,2020-01-31",
                    "clinic_number,visit_date,examiner\nA-1,2024-05-01,Some\nA-1,2024-05-02,N. Obody");
            assertThatThrownBy(() -> imports.bringIn(files)).isInstanceOf(DataIntegrityViolationException.class);
            assertThat(rows()).isEmpty();
        } finally {
            database.sql("alter table visit drop constraint no_such_examiner").update();
        }
    }

    @Test
    void refusesADayOfBirthAfterAVisitThatIsStored() {
        imports.bringIn(
                CsvFiles.pair("clinic_number,birth_date\nA-1,2020-01-31", "clinic_number,visit_date\nA-1,2024-05-01"));
        String header = "clinic_number,birth_date\n";
        assertThat(imports.look(CsvFiles.pair(header + "A-1,2024-05-01", null)).isRefused())
                .isFalse();
        assertThat(refusals(imports.look(CsvFiles.pair(header + "A-1,2024-05-02", null))))
                .isEqualTo("children.csv 2 birth_date");
    }

    @Test
    void storesOnlyWhatWasLookedAt() {
        CsvPair files = CsvFiles.pair("clinic_number,birth_date,note\nA-1,2020-01-31,mine", null);
        String seen = imports.look(files).fingerprint();
        imports.bringIn(CsvFiles.pair("clinic_number,birth_date,note\nA-1,2020-01-31,theirs", null));
        assertThat(imports.bringInAsSeen(files, seen)).isEmpty();
        assertThat(imports.bringInAsSeen(files, imports.look(files).fingerprint()))
                .contains(new Counts(0, 1, 0));
    }

    @Test
    void bringsInFiveThousandVisitsWithFewStatements() {
        Statistics statements = entities.unwrap(SessionFactory.class).getStatistics();
        CsvPair files = CsvFiles.many(5000);
        statements.clear();
        assertThat(imports.bringIn(files).counts()).isEqualTo(new Counts(5500, 0, 0));
        assertThat(statements.getPrepareStatementCount()).isLessThan(300);
        assertThat(imports.bringIn(files).counts()).isEqualTo(new Counts(0, 0, 5500));
    }

    /** Every row of children and visits with its version. */
    private List<String> rows() {
        return database.sql("select clinic_number, version, changed_at from child"
                        + " union all select cast(child_id as varchar) || visit_date, version, changed_at from visit"
                        + " order by 1")
                .query((row, number) -> row.getString(1) + " " + row.getInt(2) + " " + row.getTimestamp(3))
                .list();
    }

    private static String refusals(Plan plan) {
        return plan.refusals().listed().stream()
                .map(cell -> cell.file().fileName() + " " + cell.row() + " " + cell.column())
                .collect(Collectors.joining("\n"));
    }
}
