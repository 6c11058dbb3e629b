package plusward.exchange;

import static org.assertj.core.api.Assertions.assertThat;

import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpRequest.BodyPublishers;
import java.net.http.HttpResponse;
import java.net.http.HttpResponse.BodyHandlers;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import org.junit.jupiter.api.Test;
import org.springframework.boot.test.web.server.LocalServerPort;

/** Uploads that are no proper form, over a real connection. */
@WholeClinic
class LargeUploadsTests {

    private static final String FORM = "multipart/form-data; boundary=XX";
    private static final String PART =
            "--XX\r\nContent-Disposition: form-data; name=\"children\"; filename=\"c.csv\"\r\n\r\n";

    @LocalServerPort
    int port;

    @Test
    void refusesWhatIsTooLargeWithASentence() throws Exception {
        String large = PART + "x".repeat(21 << 20) + "\r\n--XX--\r\n";
        HttpResponse<String> answer = send("/api/import", FORM, large);
        assertThat(answer.statusCode()).isEqualTo(413);
        assertThat(answer.headers().firstValue("Content-Type")).hasValue("application/problem+json");
        assertThat(answer.body()).contains("too large");
        HttpResponse<String> page = send("/exchange", FORM, large);
        assertThat(page.statusCode()).isEqualTo(413);
        assertThat(page.body()).contains("That file is too large", "20 MB");
    }

    @Test
    void refusesABrokenFormAsTheSendersMistake() throws Exception {
        assertThat(send("/api/import", "multipart/form-data", PART).statusCode())
                .isEqualTo(400);
        assertThat(send("/api/import", FORM, PART + "clinic_num").statusCode()).isBetween(400, 422);
        assertThat(send("/api/import", FORM, "").statusCode()).isEqualTo(400);
        assertThat(send("/api/import", FORM, "--XX--").statusCode()).isEqualTo(400);
        assertThat(send("/api/import", "text/csv", "clinic_number").statusCode())
                .isEqualTo(415);
        String manyParts = PART.replace("children", "x").concat("\r\n").repeat(2000) + "--XX--\r\n";
        assertThat(send("/api/import", FORM, manyParts).statusCode()).isBetween(400, 413);
    }

    private HttpResponse<String> send(String path, String type, String body) throws Exception {
        String password = Base64.getEncoder().encodeToString("robot:open".getBytes(StandardCharsets.UTF_8));
        HttpRequest request = HttpRequest.newBuilder(URI.create("http://localhost:" + port + path))
                .header("Content-Type", type)
                .header("Authorization", "Basic " + password)
                .POST(BodyPublishers.ofString(body))
                .build();
        return HttpClient.newHttpClient().send(request, BodyHandlers.ofString());
    }
}
