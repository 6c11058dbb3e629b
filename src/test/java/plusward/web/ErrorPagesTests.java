package plusward.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.net.http.HttpResponse.BodyHandlers;
import org.junit.jupiter.api.Test;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.context.SpringBootTest.WebEnvironment;
import org.springframework.boot.test.web.server.LocalServerPort;

/** The whole application on a database in memory, asked over a real connection: what a stranger sees. */
@SpringBootTest(webEnvironment = WebEnvironment.RANDOM_PORT)
@AClinicInMemory
class ErrorPagesTests {

    @LocalServerPort
    int port;

    private final HttpClient client = HttpClient.newHttpClient();

    @Test
    void answersAProgramThatDidNotSignInWithProblemDetails() throws Exception {
        HttpResponse<String> answer = get("/api/export.zip");
        assertThat(answer.statusCode()).isEqualTo(401);
        assertThat(answer.headers().firstValue("WWW-Authenticate"))
                .hasValueSatisfying(value -> assertThat(value).startsWith("Basic"));
        assertThat(answer.headers().firstValue("Content-Type")).contains("application/problem+json");
        assertThat(answer.headers().firstValue("Set-Cookie")).isEmpty();
        assertThat(answer.body()).contains("\"status\":401").contains("HTTP Basic");
    }

    @Test
    void tellsOnlyThatTheApplicationIsUp() throws Exception {
        HttpResponse<String> answer = get("/actuator/health");
        assertThat(answer.statusCode()).isEqualTo(200);
        assertThat(answer.body()).isEqualTo("{\"status\":\"UP\"}");
    }

    private HttpResponse<String> get(String path) throws IOException, InterruptedException {
        URI address = URI.create("http://localhost:" + port + path);
        return client.send(HttpRequest.newBuilder(address).build(), BodyHandlers.ofString());
    }
}
