package plusward.web;

import io.zonky.test.db.postgres.embedded.EmbeddedPostgres;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.util.UUID;
import org.jspecify.annotations.Nullable;
import org.springframework.boot.test.util.TestPropertyValues;
import org.springframework.context.ApplicationContextInitializer;
import org.springframework.context.ConfigurableApplicationContext;

/**
 * A PostgreSQL for a test, with a schema of its own: the server named by the system property {@code pg.url}, or else one
 * that is started here once and ends with the tests.
 */
public final class RealPostgres implements ApplicationContextInitializer<ConfigurableApplicationContext> {

    private static @Nullable EmbeddedPostgres started;

    @Override
    public void initialize(ConfigurableApplicationContext context) {
        TestPropertyValues.of("spring.datasource.url=" + withSchema(server()), "spring.flyway.placeholders.blob=bytea")
                .applyTo(context);
    }

    private static String withSchema(String url) {
        String schema = "t" + UUID.randomUUID().toString().replace("-", "");
        try (var connection = DriverManager.getConnection(url);
                var statement = connection.createStatement()) {
            statement.execute("create schema " + schema);
        } catch (SQLException unreachable) {
            throw new IllegalStateException(unreachable);
        }
        return url + (url.contains("?") ? "&" : "?") + "currentSchema=" + schema;
    }

    private static synchronized String server() {
        String given = System.getProperty("pg.url", "");
        if (!given.isEmpty()) {
            return given;
        }
        try {
            started = started == null ? EmbeddedPostgres.builder().start() : started;
            return started.getJdbcUrl("postgres", "postgres");
        } catch (IOException notStarted) {
            throw new UncheckedIOException(notStarted);
        }
    }
}
