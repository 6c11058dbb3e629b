package plusward.people;

import static org.assertj.core.api.Assertions.assertThat;

import io.zonky.test.db.postgres.embedded.EmbeddedPostgres;
import java.io.IOException;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.context.SpringBootTest.WebEnvironment;
import org.springframework.boot.test.web.server.LocalServerPort;
import org.springframework.jdbc.core.JdbcTemplate;
import org.springframework.test.annotation.DirtiesContext;
import org.springframework.test.context.ActiveProfiles;
import org.springframework.test.context.DynamicPropertyRegistry;
import org.springframework.test.context.DynamicPropertySource;
import plusward.web.Browser;

/** The whole application on a real PostgreSQL: the migrations run, accounts and sessions are kept there. */
@SpringBootTest(
        webEnvironment = WebEnvironment.RANDOM_PORT,
        properties = {"PLUSWARD_ADMIN_NAME=root", "PLUSWARD_ADMIN_PASSWORD=orchard steps lamp"})
@ActiveProfiles("postgresql")
@DirtiesContext
class OnPostgresqlTests {

    private static final EmbeddedPostgres SERVER = start();

    @LocalServerPort
    int port;

    @Autowired
    JdbcTemplate database;

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
    void signsInAndKeepsTheSessionInTheDatabase() throws Exception {
        Browser browser = new Browser(port);
        browser.signIn("root", "orchard steps lamp");
        assertThat(browser.get("/people").body()).contains("root").contains(">administrator<");
        assertThat(database.queryForList("select principal_name from spring_session", String.class))
                .contains("root");
        assertThat(String.valueOf(database.queryForObject("select version()", String.class)))
                .startsWith("PostgreSQL");
    }
}
