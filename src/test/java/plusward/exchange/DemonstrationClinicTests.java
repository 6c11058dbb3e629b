package plusward.exchange;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.DefaultApplicationArguments;
import org.springframework.boot.diagnostics.FailureAnalysis;
import org.springframework.jdbc.core.simple.JdbcClient;
import plusward.web.Sentences;

/** The start of the demonstration clinic. */
@WholeClinic
class DemonstrationClinicTests {

    @Autowired
    Imports imports;

    @Autowired
    ClinicRecords clinic;

    @Autowired
    Sentences sentences;

    @Autowired
    JdbcClient database;

    @Test
    void fillsAnEmptyClinicOnce() {
        start();
        assertThat(stored()).isEqualTo(29);
        database.sql("update child set given_name = 'Corrected'").update();
        start();
        assertThat(database.sql("select distinct given_name from child")
                        .query(String.class)
                        .list())
                .containsExactly("Corrected");
    }

    @Test
    void stopsTheStartWithASentenceWhenItsFilesAreRefused() {
        DemonstrationClinic demonstration = new DemonstrationClinic(imports, clinic, sentences);
        CsvPair files = CsvFiles.pair("clinic_number,birth_date\nA-1,2020-01-31\nA-2,soon", null);
        DemonstrationClinic.Refused refused =
                catchThrowableOfType(DemonstrationClinic.Refused.class, () -> demonstration.fill(files));
        FailureAnalysis analysis = new DemonstrationFailure().analyze(refused, refused);
        assertThat(analysis.getDescription())
                .contains("children.csv, row 3, column birth_date", "“soon”", "2026-03-14");
        assertThat(analysis.getAction()).contains("seed-data");
        assertThat(stored()).isZero();
    }

    private void start() {
        new DemonstrationClinic(imports, clinic, sentences).run(new DefaultApplicationArguments());
    }

    private int stored() {
        return database.sql("select count(*) from child").query(Integer.class).single();
    }
}
