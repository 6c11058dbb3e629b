package plusward.exchange;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.not;
import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.csrf;
import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.user;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.get;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.multipart;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.post;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.content;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.flash;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.redirectedUrl;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.status;

import jakarta.servlet.http.Cookie;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.jdbc.core.simple.JdbcClient;
import org.springframework.mock.web.MockMultipartFile;
import org.springframework.test.web.servlet.MockMvc;
import org.springframework.test.web.servlet.ResultActions;
import org.springframework.test.web.servlet.request.AbstractMockHttpServletRequestBuilder;

/** Choosing, looking and bringing in on the page. */
@WholeClinic
class ExchangePageTests {

    private static final String CHILDREN = "clinic_number,birth_date,note\nA-1,2020-01-31,";

    @Autowired
    MockMvc browser;

    @Autowired
    JdbcClient database;

    @Test
    void asksForFilesAndIsNamed() throws Exception {
        open().andExpect(status().isOk())
                .andExpect(content().string(containsString("<title>Bring in, take out</title>")))
                .andExpect(content().string(containsString("enctype=\"multipart/form-data\"")))
                .andExpect(content().string(not(containsString("Bring these in"))))
                .andExpect(content().string(not(containsString("??"))));
    }

    @Test
    void showsThePreviewAndStoresOnApply() throws Exception {
        choose(CHILDREN + "tall").andExpect(redirectedUrl("/exchange"));
        String page = body(open());
        assertThat(page).contains("<dd>1</dd>", "children.csv, 1 row", "Bring these in");
        assertThat(stored()).isZero();
        apply(page).andExpect(redirectedUrl("/exchange")).andExpect(flash().attributeExists("done"));
        assertThat(stored()).isEqualTo(1);
        assertThat(body(open())).doesNotContain("Bring these in");
    }

    @Test
    void showsEachChangedCellBeforeAndAfter() throws Exception {
        choose(CHILDREN + "tall");
        apply(body(open()));
        choose(CHILDREN);
        assertThat(body(open())).contains("tall", "not measured", "Changed cells");
        choose(CHILDREN + "tall");
        assertThat(body(open())).contains("Nothing would change").doesNotContain("Bring these in");
    }

    @Test
    void listsWhatIsRefusedAndOffersNoApply() throws Exception {
        choose("clinic_number,birth_date\nA-1,31/01/2020\nA-1,<b>");
        assertThat(body(open()))
                .contains("<title>Error: Bring in, take out</title>", "role=\"alert\"", "31/01/2020", "2026-03-14")
                .contains("3 cells cannot be taken in", "&lt;b&gt;")
                .doesNotContain("Bring these in", "??");
    }

    @Test
    void doesNotStoreWhatWasNotLookedAt() throws Exception {
        choose(CHILDREN + "seen");
        String page = body(open());
        choose(CHILDREN + "unseen");
        apply(page).andExpect(flash().attribute("trouble", "exchange.moved"));
        assertThat(stored()).isZero();
        send(post("/exchange/apply")).andExpect(flash().attribute("trouble", "exchange.moved"));
        assertThat(stored()).isZero();
    }

    @Test
    void appliesOnceAndSaysSoTheSecondTime() throws Exception {
        choose(CHILDREN);
        String page = body(open());
        assertThat(body(follow(apply(page)))).contains("1 row was new, none was changed, none was the same.");
        assertThat(body(follow(apply(page)))).contains("There is no preview to bring in", "role=\"alert\"");
    }

    @Test
    void leavesTheFilesOnRequest() throws Exception {
        choose(CHILDREN);
        send(post("/exchange/leave")).andExpect(redirectedUrl("/exchange"));
        assertThat(body(open())).doesNotContain("Bring these in");
        assertThat(stored()).isZero();
    }

    @Test
    void keepsEachAccountsFilesApart() throws Exception {
        choose(CHILDREN);
        browser.perform(get("/exchange").with(user("other").roles("ADMINISTRATOR")))
                .andExpect(content().string(not(containsString("Bring these in"))));
    }

    @Test
    void asksAgainWhenNoFileWasChosen() throws Exception {
        send(multipart("/exchange").file(new MockMultipartFile("children", "", null, new byte[0])))
                .andExpect(status().isUnprocessableContent())
                .andExpect(content().string(containsString("No file was chosen")));
    }

    @Test
    void isForAdministratorsAndAsksForTheToken() throws Exception {
        browser.perform(get("/exchange").with(user("d").roles("DOCTOR", "STAFF", "MACHINE")))
                .andExpect(status().isForbidden());
        browser.perform(post("/exchange/apply").with(user("a").roles("ADMINISTRATOR")))
                .andExpect(status().is4xxClientError());
    }

    private ResultActions choose(String children) throws Exception {
        byte[] bytes = CsvFiles.bytes(children);
        return send(multipart("/exchange").file(new MockMultipartFile("children", "my.csv", "text/csv", bytes)));
    }

    /** Opens the page that an answer leads to, in the same session. */
    private ResultActions follow(ResultActions answer) throws Exception {
        Cookie[] session = answer.andExpect(redirectedUrl("/exchange"))
                .andReturn()
                .getResponse()
                .getCookies();
        return send(get("/exchange").cookie(session));
    }

    private ResultActions open() throws Exception {
        return send(get("/exchange"));
    }

    private ResultActions apply(String page) throws Exception {
        Matcher seen = Pattern.compile("name=\"seen\" value=\"([0-9a-f]+)\"").matcher(page);
        assertThat(seen.find()).isTrue();
        return send(post("/exchange/apply").param("seen", seen.group(1)));
    }

    private ResultActions send(AbstractMockHttpServletRequestBuilder<?> request) throws Exception {
        return browser.perform(request.with(user("lead").roles("ADMINISTRATOR")).with(csrf()));
    }

    private static String body(ResultActions answer) throws Exception {
        return answer.andExpect(status().isOk()).andReturn().getResponse().getContentAsString();
    }

    private int stored() {
        return database.sql("select count(*) from child").query(Integer.class).single();
    }
}
