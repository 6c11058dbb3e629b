package plusward.exchange;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.hasSize;
import static org.hamcrest.Matchers.not;
import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.httpBasic;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.multipart;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.post;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.content;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.header;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.jsonPath;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.status;

import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.http.MediaType;
import org.springframework.jdbc.core.simple.JdbcClient;
import org.springframework.mock.web.MockMultipartFile;
import org.springframework.test.web.servlet.MockMvc;
import org.springframework.test.web.servlet.ResultActions;
import org.springframework.test.web.servlet.request.MockMultipartHttpServletRequestBuilder;

/** What a program meets at {@code POST /api/import}. */
@WholeClinic
class ImportApiTests {

    private static final String CHILDREN = "clinic_number,birth_date\nA-1,2020-01-31\n";
    private static final String VISITS = "clinic_number,visit_date,worn_right\nA-1,2024-05-01,+3.00\n";

    @Autowired
    MockMvc program;

    @Autowired
    JdbcClient database;

    @Test
    void countsWithoutStoringUntilAskedToApply() throws Exception {
        send(files(CHILDREN, VISITS).param("apply", "false"))
                .andExpect(status().isOk())
                .andExpect(jsonPath("$.new").value(2))
                .andExpect(jsonPath("$.applied").value(false));
        send(files(CHILDREN, VISITS)).andExpect(jsonPath("$.applied").value(false));
        assertThat(stored()).isZero();
        send(files(CHILDREN, VISITS).param("apply", "true"))
                .andExpect(status().isOk())
                .andExpect(content().contentType(MediaType.APPLICATION_JSON))
                .andExpect(content().json("""
                        {"applied": true, "new": 2, "changed": 0, "same": 0, "refused": [], "refusedInAll": 0,
                         "files": {"children.csv": {"new": 1, "changed": 0, "same": 0, "refused": 0},
                                   "visits.csv": {"new": 1, "changed": 0, "same": 0, "refused": 0}}}"""));
        assertThat(stored()).isEqualTo(2);
    }

    @Test
    void countsChangedAndTheSame() throws Exception {
        send(files(CHILDREN, VISITS).param("apply", "true"));
        send(files(CHILDREN, VISITS.replace("+3.00", "+3.25")).param("apply", "true"))
                .andExpect(jsonPath("$.new").value(0))
                .andExpect(jsonPath("$.changed").value(1))
                .andExpect(jsonPath("$.same").value(1));
    }

    @Test
    void takesEitherFileAlone() throws Exception {
        send(files(CHILDREN, null).param("apply", "true"))
                .andExpect(jsonPath("$.files['children.csv'].new").value(1));
        send(files(null, VISITS).param("apply", "true"))
                .andExpect(jsonPath("$.files['visits.csv'].new").value(1));
    }

    @Test
    void namesEachRefusedCellAndStoresNothing() throws Exception {
        send(files(CHILDREN, VISITS.replace("+3.00", "3.00")).param("apply", "true"))
                .andExpect(status().isUnprocessableContent())
                .andExpect(jsonPath("$.applied").value(false))
                .andExpect(jsonPath("$.refused", hasSize(1)))
                .andExpect(jsonPath("$.refused[0].file").value("visits.csv"))
                .andExpect(jsonPath("$.refused[0].row").value(2))
                .andExpect(jsonPath("$.refused[0].column").value("worn_right"))
                .andExpect(jsonPath("$.refused[0].read").value("3.00"))
                .andExpect(jsonPath("$.refused[0].accepted", containsString("+3.50 -0.75 x 180")))
                .andExpect(jsonPath("$.refused[0].problem", containsString("sign")));
        assertThat(stored()).isZero();
    }

    @Test
    void answersAFileThatCannotBeReadByItsFirstRow() throws Exception {
        byte[] latin = {'c', 'l', 'i', (byte) 0xEB};
        send(multipart("/api/import").file(new MockMultipartFile("children", "children.csv", "text/csv", latin)))
                .andExpect(status().isUnprocessableContent())
                .andExpect(jsonPath("$.refused[0].row").value(1))
                .andExpect(jsonPath("$.refused[0].read").value("0xEB"));
        send(files("", null))
                .andExpect(status().isUnprocessableContent())
                .andExpect(jsonPath("$.refused[0].accepted", containsString("names the columns")));
    }

    @Test
    void answersWhatIsNoImportWithProblemDetails() throws Exception {
        expectProblem(send(multipart("/api/import")), 400, "children and visits");
        expectProblem(send(files(CHILDREN, null).param("apply", "yes")), 400, "true or false");
        expectProblem(
                program.perform(post("/api/import")
                        .with(httpBasic("robot", "open"))
                        .contentType(MediaType.APPLICATION_JSON)
                        .content("{}")),
                415,
                "could not be read");
        assertThat(stored()).isZero();
    }

    @Test
    void answersAConcurrentChangeWithConflict() throws Exception {
        database.sql("alter table child add constraint nobody check (clinic_number <> 'A-1')")
                .update();
        try {
            expectProblem(send(files(CHILDREN, VISITS).param("apply", "true")), 409, "send them again");
        } finally {
            database.sql("alter table child drop constraint nobody").update();
        }
    }

    @Test
    void isClosedToStrangersAndToOtherRoles() throws Exception {
        program.perform(files(CHILDREN, null)).andExpect(status().isUnauthorized());
        program.perform(files(CHILDREN, null).with(httpBasic("robot", "wrong"))).andExpect(status().isUnauthorized());
        program.perform(files(CHILDREN, null).with(httpBasic("clerk", "open"))).andExpect(status().isForbidden());
        assertThat(stored()).isZero();
    }

    @Test
    void keepsNoSession() throws Exception {
        send(files(CHILDREN, null)).andExpect(header().doesNotExist("Set-Cookie"));
    }

    private ResultActions send(MockMultipartHttpServletRequestBuilder request) throws Exception {
        return program.perform(request.with(httpBasic("robot", "open")));
    }

    private static void expectProblem(ResultActions answer, int status, String detail) throws Exception {
        answer.andExpect(status().is(status))
                .andExpect(content().contentTypeCompatibleWith(MediaType.APPLICATION_PROBLEM_JSON))
                .andExpect(jsonPath("$.status").value(status))
                .andExpect(jsonPath("$.title", not("")))
                .andExpect(jsonPath("$.detail", containsString(detail)));
    }

    private static MockMultipartHttpServletRequestBuilder files(String children, String visits) {
        MockMultipartHttpServletRequestBuilder request = multipart("/api/import");
        if (children != null) {
            request.file(new MockMultipartFile("children", "children.csv", "text/csv", CsvFiles.bytes(children)));
        }
        if (visits != null) {
            request.file(new MockMultipartFile("visits", "visits.csv", "text/csv", CsvFiles.bytes(visits)));
        }
        return request;
    }

    private long stored() {
        return database.sql("select (select count(*) from child) + (select count(*) from visit)")
                .query(Long.class)
                .single();
    }
}
