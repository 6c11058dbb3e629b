package plusward.entry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.csrf;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.post;

import java.time.LocalDate;
import java.util.regex.Pattern;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.webmvc.test.autoconfigure.AutoConfigureMockMvc;
import org.springframework.jdbc.core.simple.JdbcClient;
import org.springframework.mock.web.MockHttpServletResponse;
import org.springframework.security.test.context.support.WithMockUser;
import org.springframework.test.context.jdbc.Sql;
import org.springframework.test.web.servlet.MockMvc;
import org.springframework.util.MultiValueMap;
import plusward.child.ChildDetails;
import plusward.child.Children;
import plusward.web.AClinicInMemory;

/** 400 malformed visits, 40 of each of ten kinds, sent to be saved and to be read back in the whole application. */
@SpringBootTest
@AutoConfigureMockMvc
@AClinicInMemory
@Sql("/plusward/exchange/empty-clinic.sql")
@WithMockUser(username = "clerk", roles = "STAFF")
class MalformedVisitsTests {

    private static final int OF_EACH_KIND = 40;

    /** A field that the summary of what is wrong leads to. */
    private static final Pattern NAMED = Pattern.compile("id=\"errors\".*?href=\"#[a-z_]+\"", Pattern.DOTALL);

    @Autowired
    MockMvc browser;

    @Autowired
    Children children;

    @Autowired
    JdbcClient database;

    @ParameterizedTest
    @EnumSource
    void noneIsStoredNoneFailsAndEachIsToldWhatIsWrong(MalformedVisits.Kind kind) throws Exception {
        LocalDate born = LocalDate.parse("2019-05-02");
        long child = children.add(new ChildDetails("M-" + kind.ordinal(), null, null, born, null, "en", null))
                .id();
        for (int seed = 0; seed < OF_EACH_KIND; seed++) {
            MultiValueMap<String, String> visit = MalformedVisits.of(kind, seed);
            MockHttpServletResponse read = sent("/children/" + child + "/visits/new/read-back", visit);
            assertThat(read.getStatus()).as("%s %s", kind, seed).isEqualTo(200);
            MockHttpServletResponse saved = sent("/children/" + child + "/visits/new", visit);
            assertThat(saved.getStatus()).as("%s %s", kind, seed).isEqualTo(422);
            assertThat(NAMED.matcher(saved.getContentAsString()).find())
                    .as("%s %s", kind, seed)
                    .isTrue();
        }
        assertThat(database.sql("select count(*) from visit").query(Long.class).single())
                .isZero();
    }

    private MockHttpServletResponse sent(String path, MultiValueMap<String, String> visit) throws Exception {
        return browser.perform(post(path).params(visit).with(csrf()))
                .andReturn()
                .getResponse();
    }
}
