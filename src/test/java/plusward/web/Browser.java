package plusward.web;

import java.io.IOException;
import java.net.CookieManager;
import java.net.URI;
import java.net.URLEncoder;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpRequest.BodyPublishers;
import java.net.http.HttpResponse;
import java.net.http.HttpResponse.BodyHandlers;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/** A plain browser for tests over a real connection: keeps its cookies, follows redirects, sends the form's token. */
public final class Browser {

    private static final Pattern TOKEN = Pattern.compile("name=\"_csrf\" value=\"([^\"]+)\"");

    private final HttpClient client = HttpClient.newBuilder()
            .cookieHandler(new CookieManager())
            .followRedirects(HttpClient.Redirect.NORMAL)
            .build();
    private final String root;

    public Browser(int port) {
        this.root = "http://localhost:" + port;
    }

    public HttpResponse<String> get(String path) throws IOException, InterruptedException {
        return send(HttpRequest.newBuilder(URI.create(root + path)));
    }

    /** As a program does: name and password with the request, no session. */
    public HttpResponse<String> getAs(String name, String password, String path)
            throws IOException, InterruptedException {
        byte[] pair = (name + ":" + password).getBytes(StandardCharsets.UTF_8);
        return send(HttpRequest.newBuilder(URI.create(root + path))
                .header("Authorization", "Basic " + Base64.getEncoder().encodeToString(pair)));
    }

    /** Opens the page for its token, then sends the fields to the same address. */
    public HttpResponse<String> submit(String path, Map<String, String> fields)
            throws IOException, InterruptedException {
        return submit(path, path, fields);
    }

    /** Opens the page for its token, then sends the fields where its form leads. */
    public HttpResponse<String> submit(String page, String path, Map<String, String> fields)
            throws IOException, InterruptedException {
        Matcher token = TOKEN.matcher(get(page).body());
        String tail = token.find() ? "&_csrf=" + encoded(token.group(1)) : "";
        String body = fields.entrySet().stream()
                .map(field -> field.getKey() + "=" + encoded(field.getValue()))
                .collect(Collectors.joining("&"));
        return send(HttpRequest.newBuilder(URI.create(root + path))
                .header("Content-Type", "application/x-www-form-urlencoded")
                .POST(BodyPublishers.ofString(body + tail)));
    }

    public HttpResponse<String> signIn(String name, String password) throws IOException, InterruptedException {
        return submit("/sign-in", Map.of("username", name, "password", password));
    }

    private HttpResponse<String> send(HttpRequest.Builder request) throws IOException, InterruptedException {
        return client.send(request.build(), BodyHandlers.ofString());
    }

    private static String encoded(String value) {
        return URLEncoder.encode(value, StandardCharsets.UTF_8);
    }
}
