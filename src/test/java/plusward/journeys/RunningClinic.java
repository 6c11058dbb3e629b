package plusward.journeys;

import java.io.File;
import java.io.IOException;
import java.net.CookieManager;
import java.net.URI;
import java.net.URLEncoder;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse.BodyHandlers;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Duration;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/** The demonstration clinic in a process of its own, so that it can be killed; spoken to over HTTP. */
final class RunningClinic implements AutoCloseable {

    private static final Duration PATIENCE = Duration.ofMinutes(3);
    private static final Pattern INPUT = Pattern.compile("<input\\b[^>]*>");

    private final Process process;
    private final String address;
    private final HttpClient http = HttpClient.newBuilder()
            .cookieHandler(new CookieManager())
            .followRedirects(HttpClient.Redirect.NORMAL)
            .build();

    private RunningClinic(Process process, int port) {
        this.process = process;
        this.address = "http://localhost:" + port;
    }

    static RunningClinic start(Path data, int port) throws IOException, InterruptedException {
        ProcessBuilder builder = new ProcessBuilder(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-XX:TieredStopAtLevel=1",
                "-cp",
                System.getProperty("java.class.path"),
                "plusward.PluswardApplication",
                "--spring.profiles.active=demo",
                "--server.port=" + port,
                "--plusward.data=" + data);
        File log = data.resolve("log.txt").toFile();
        Process process = builder.redirectErrorStream(true)
                .redirectOutput(ProcessBuilder.Redirect.appendTo(log))
                .start();
        RunningClinic clinic = new RunningClinic(process, port);
        clinic.awaitStart();
        clinic.signIn();
        return clinic;
    }

    private void awaitStart() throws InterruptedException, IOException {
        long giveUp = System.nanoTime() + PATIENCE.toNanos();
        while (process.isAlive() && System.nanoTime() < giveUp) {
            try {
                if (get("/actuator/health").contains("UP")) {
                    return;
                }
            } catch (IOException notYet) {
                process.waitFor(200, TimeUnit.MILLISECONDS);
            }
        }
        throw new IOException("the clinic did not start");
    }

    private void signIn() throws IOException, InterruptedException {
        Map<String, String> form = inputs(get("/sign-in"));
        form.put("username", "staff");
        form.put("password", "plain glass morning");
        post("/sign-in", form);
    }

    /** Logs a visit as the page's form would, and gives back the page that confirms it. */
    String logVisit(String clinicNumber, Map<String, String> typed) throws IOException, InterruptedException {
        String path = "/children/" + id(clinicNumber) + "/visits/new";
        Map<String, String> form = inputs(get(path));
        form.putAll(typed);
        return post(path, form);
    }

    String course(String clinicNumber) throws IOException, InterruptedException {
        return get("/children/" + id(clinicNumber) + "/course.json");
    }

    private String id(String clinicNumber) throws IOException, InterruptedException {
        Matcher link = Pattern.compile("/children/(\\d+)\"").matcher(get("/children?q=" + clinicNumber));
        if (!link.find()) {
            throw new IOException("no child " + clinicNumber);
        }
        return link.group(1);
    }

    private String get(String path) throws IOException, InterruptedException {
        HttpRequest request = HttpRequest.newBuilder(URI.create(address + path)).build();
        return http.send(request, BodyHandlers.ofString()).body();
    }

    private String post(String path, Map<String, String> form) throws IOException, InterruptedException {
        String body = form.entrySet().stream()
                .map(field -> encoded(field.getKey()) + "=" + encoded(field.getValue()))
                .collect(Collectors.joining("&"));
        HttpRequest request = HttpRequest.newBuilder(URI.create(address + path))
                .header("Content-Type", "application/x-www-form-urlencoded")
                .POST(HttpRequest.BodyPublishers.ofString(body))
                .build();
        return http.send(request, BodyHandlers.ofString()).body();
    }

    /** The names and values of a page's inputs, the hidden ones among them. */
    private static Map<String, String> inputs(String page) {
        Map<String, String> inputs = new LinkedHashMap<>();
        Matcher input = INPUT.matcher(page);
        while (input.find()) {
            String name = attribute(input.group(), "name");
            if (!name.isEmpty() && !input.group().contains("checkbox")) {
                inputs.put(name, attribute(input.group(), "value"));
            }
        }
        return inputs;
    }

    private static String attribute(String tag, String name) {
        Matcher matcher = Pattern.compile("\\s" + name + "=\"([^\"]*)\"").matcher(tag);
        return matcher.find() ? matcher.group(1) : "";
    }

    private static String encoded(String text) {
        return URLEncoder.encode(text, StandardCharsets.UTF_8);
    }

    /** SIGKILL, with no chance to tidy up. */
    void kill() {
        process.destroyForcibly().onExit().join();
    }

    @Override
    public void close() {
        kill();
    }
}
