package plusward.exchange;

import static org.assertj.core.api.Assertions.assertThat;

import io.zonky.test.db.postgres.embedded.EmbeddedPostgres;
import java.io.IOException;
import java.util.Objects;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.test.annotation.DirtiesContext;
import org.springframework.test.context.ActiveProfiles;
import org.springframework.test.context.DynamicPropertyRegistry;
import org.springframework.test.context.DynamicPropertySource;
import plusward.exchange.Outcome.Counts;

/** The same import on a real PostgreSQL. */
@SpringBootTest
@ActiveProfiles("postgresql")
@DirtiesContext
class OnPostgresqlTests {

    private static final EmbeddedPostgres SERVER = start();

    @Autowired
    Imports imports;

    @Autowired
    Uploads uploads;

    private static EmbeddedPostgres start() {
        try {
            return EmbeddedPostgres.start();
        } catch (IOException cause) {
            throw new IllegalStateException(cause);
        }
    }

    @DynamicPropertySource
    static void connect(DynamicPropertyRegistry properties) {
        properties.add("spring.datasource.url", () -> SERVER.getJdbcUrl("postgres", "postgres"));
    }

    @AfterAll
    static void stop() throws IOException {
        SERVER.close();
    }

    @Test
    void bringsInTheDemonstrationClinicAndASecondTimeChangesNothing() {
        assertThat(imports.bringIn(CsvFiles.seed()).counts()).isEqualTo(new Counts(29 + 231, 0, 0));
        assertThat(imports.bringIn(CsvFiles.seed()).counts()).isEqualTo(new Counts(0, 0, 29 + 231));
    }

    @Test
    void keepsTheChosenFilesUntilTheyAreReplacedOrForgotten() {
        uploads.keep("lead", CsvFiles.pair("first", "second"));
        uploads.keep("lead", CsvFiles.pair(null, "third"));
        CsvPair kept = uploads.of("lead").orElseThrow();
        assertThat(kept.bytesOf(CsvKind.CHILDREN)).isNull();
        assertThat(new String(Objects.requireNonNull(kept.bytesOf(CsvKind.VISITS))))
                .isEqualTo("third");
        uploads.forget("lead");
        assertThat(uploads.of("lead")).isEmpty();
    }
}
