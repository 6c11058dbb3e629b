package plusward.journeys;

import static com.microsoft.playwright.assertions.PlaywrightAssertions.assertThat;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.deque.html.axecore.playwright.AxeBuilder;
import com.microsoft.playwright.Locator;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.Request;
import com.microsoft.playwright.options.ColorScheme;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.springframework.boot.test.web.server.LocalServerPort;

/** A segment measured on a picture that never leaves the browser. */
@DemonstrationClinic
class PhotographTests {

    private static final int LARGEST_REQUEST = 8 * 1024;

    private static Chromium chromium;

    @TempDir
    private Path folder;

    @LocalServerPort
    private int port;

    private final List<Request> requests = new ArrayList<>();
    private Page page;

    @BeforeAll
    static void startBrowser() {
        chromium = Chromium.start();
    }

    @AfterAll
    static void stopBrowser() {
        if (chromium != null) {
            chromium.close();
        }
    }

    @BeforeEach
    void openAVisit() {
        page = chromium.page(1280, 1000, ColorScheme.LIGHT);
        DemonstrationClinic.SignIn.asStaff(page, "http://localhost:" + port);
        page.navigate("http://localhost:" + port + "/children?q=A-1003");
        page.navigate("http://localhost:" + port
                + page.locator("a[href^='/children/']:has-text('Escamilla')")
                        .first()
                        .getAttribute("href")
                + "/visits/new");
        requests.clear();
        page.onRequest(requests::add);
    }

    @Test
    void marksByKeyboardAndPointerFillTheFieldsAndThePictureIsNeverSent() throws IOException {
        DrawnFace face = DrawnFace.RAISED_RIGHT;
        Path picture = pick(face);
        setByKeys(face);
        face.left().forEach(mark -> setByPointer(face, mark));
        Locator result = page.locator("#photo-result");
        assertThat(result).containsText("mm (below the pupil centre)");
        assertThat(result).containsText("Check on the child.");
        assertThat(page.locator("[name=segment_right_mm]")).hasValue("");

        page.locator("#photo-use").press("Enter");
        assertThat(page.locator("#photo-used")).isVisible();
        assertFilled("segment_right_mm", face.rightOffset(), error(result, "Right eye"));
        assertFilled("segment_left_mm", face.leftOffset(), error(result, "Left eye"));
        assertFilled("pupil_mm", face.pupil(), error(result, "mean pupil"));
        assertThat(page.locator("#kept")).containsText("Draft kept at");
        assertNothingOfThePictureWasSent(picture);
    }

    /** The cross begins in the middle of the picture; a key moves it by a pixel of the screen. */
    private void setByKeys(DrawnFace face) {
        Locator canvas = page.locator("#photo-picture");
        double scale = shownScale(canvas);
        long[] cross = {0, 0};
        for (double[] mark : face.right()) {
            long right = Math.round((mark[0] - face.width() / 2.0) * scale);
            long down = Math.round((mark[1] - face.height() / 2.0) * scale);
            move(canvas, "Right", right - cross[0]);
            move(canvas, "Down", down - cross[1]);
            canvas.press("Enter");
            cross = new long[] {right, down};
        }
    }

    private static void move(Locator canvas, String forward, long steps) {
        String back = forward.equals("Right") ? "Left" : "Up";
        String arrow = "Arrow" + (steps < 0 ? back : forward);
        for (long ten = Math.abs(steps) / 10; ten > 0; ten--) {
            canvas.press("Shift+" + arrow);
        }
        for (long one = Math.abs(steps) % 10; one > 0; one--) {
            canvas.press(arrow);
        }
    }

    private void setByPointer(DrawnFace face, double[] mark) {
        Locator canvas = page.locator("#photo-picture");
        double scale = shownScale(canvas);
        double width = ((Number) canvas.evaluate("e => e.clientWidth")).doubleValue();
        double height = ((Number) canvas.evaluate("e => e.clientHeight")).doubleValue();
        canvas.click(new Locator.ClickOptions()
                .setPosition(
                        (mark[0] - face.width() / 2.0) * scale + width / 2,
                        (mark[1] - face.height() / 2.0) * scale + height / 2));
    }

    /** Screen pixels to one of the picture. */
    private static double shownScale(Locator canvas) {
        return ((Number) canvas.evaluate("e => Math.min(e.clientWidth / 1200, e.clientHeight / 900)")).doubleValue();
    }

    private void assertFilled(String field, double truth, double error) {
        double value = Double.parseDouble(page.locator("[name=" + field + "]").inputValue());
        assertThat(value).as(field).isCloseTo(truth, within(error));
        assertThat(error).as(field).isBetween(0.2, 1.5);
    }

    /** The number behind the first ± after these words. */
    private static double error(Locator result, String words) {
        var matcher =
                Pattern.compile(words + ".*?± (\\d+\\.\\d)", Pattern.DOTALL).matcher(result.innerText());
        assertThat(matcher.find()).as(words).isTrue();
        return Double.parseDouble(matcher.group(1));
    }

    private void assertNothingOfThePictureWasSent(Path picture) throws IOException {
        String signature = new String(Files.readAllBytes(picture), StandardCharsets.ISO_8859_1).substring(0, 4);
        assertThat(requests).anyMatch(request -> request.url().endsWith("/segment-from-photo"));
        for (Request request : requests) {
            byte[] body = request.postDataBuffer() == null ? new byte[0] : request.postDataBuffer();
            assertThat(body.length).as(request.url()).isLessThan(LARGEST_REQUEST);
            assertThat(new String(body, StandardCharsets.ISO_8859_1))
                    .doesNotContain(signature, "base64", "picture.png");
            assertThat(request.headers().getOrDefault("content-type", "")).doesNotContain("multipart");
        }
    }

    @Test
    void aTiltedHeadIsRefusedAndNothingIsOfferedToUse() throws IOException {
        DrawnFace face = DrawnFace.TILTED;
        pick(face);
        face.right().forEach(mark -> setByPointer(face, mark));
        face.left().forEach(mark -> setByPointer(face, mark));
        assertThat(page.locator("#photo-result")).containsText("The head is tilted by 12.");
        assertThat(page.locator("#photo-use")).hasCount(0);
    }

    @Test
    void aMarkIsTakenBackByBackspaceAndCorrectedFromTheList() throws IOException {
        DrawnFace face = DrawnFace.RAISED_RIGHT;
        pick(face);
        Locator canvas = page.locator("#photo-picture");
        assertThat(page.locator("#photo-step")).containsText("1 / 10: right eye: line");
        setByPointer(face, face.right().get(0));
        setByPointer(face, face.right().get(1));
        assertThat(page.locator("#photo-step")).containsText("3 / 10: right eye: pupil, top");
        canvas.press("Backspace");
        assertThat(page.locator("#photo-step")).containsText("2 / 10");
        canvas.press("+");
        page.locator("[data-mark=left-pupil-centre]").press("Enter");
        assertThat(page.locator("#photo-step")).containsText("10 / 10: left eye: pupil, centre");
        canvas.press("Enter");
        assertThat(page.locator("[data-mark=left-pupil-centre]")).containsText("marked");
        assertThat(page.locator("#photo-step")).containsText("2 / 10");
        assertThat(page.locator("#photo-result")).isEmpty();
    }

    @Test
    void whatIsNoPictureIsSaidToBeNone() throws IOException {
        Path text = Files.writeString(folder.resolve("notes.png"), "not a picture");
        open();
        page.locator("#photo-file").setInputFiles(text);
        assertThat(page.locator("#photo-result")).containsText("not a picture that the browser can show");
        assertThat(page.locator("#photo-picture")).isHidden();
    }

    @Test
    void theOpenedPartHasNoAccessibilityViolation() throws IOException {
        DrawnFace face = DrawnFace.RAISED_RIGHT;
        pick(face);
        face.right().forEach(mark -> setByPointer(face, mark));
        face.left().forEach(mark -> setByPointer(face, mark));
        assertThat(page.locator("#photo-use")).isVisible();
        List<String> violations = new AxeBuilder(page)
                        .include(List.of("#photo"))
                        .withTags(List.of("wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"))
                        .analyze()
                        .getViolations()
                        .stream()
                        .map(rule -> rule.getId() + ": " + rule.getHelp())
                        .toList();
        assertThat(violations).isEmpty();
    }

    private Path pick(DrawnFace face) throws IOException {
        Path picture = face.drawnInto(folder.resolve("picture.png"));
        open();
        page.locator("#photo-width").fill("28");
        page.locator("#photo-file").setInputFiles(picture);
        page.locator("#photo-picture").waitFor();
        return picture;
    }

    private void open() {
        page.locator("#photo > summary").press("Enter");
    }
}
