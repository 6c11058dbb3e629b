package plusward.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.allOf;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.matchesPattern;
import static org.hamcrest.Matchers.not;
import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.user;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.content;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.jsonPath;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.status;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.system.CapturedOutput;
import org.springframework.boot.test.system.OutputCaptureExtension;
import org.springframework.context.annotation.Import;
import org.springframework.dao.OptimisticLockingFailureException;
import org.springframework.http.HttpStatus;
import org.springframework.security.access.AccessDeniedException;
import org.springframework.stereotype.Controller;
import org.springframework.test.web.servlet.MockMvc;
import org.springframework.test.web.servlet.ResultActions;
import org.springframework.test.web.servlet.request.MockMvcRequestBuilders;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.multipart.MaxUploadSizeExceededException;
import org.springframework.web.server.ResponseStatusException;

@PageSlice(FailuresTests.Failing.class)
@Import(FailuresTests.Failing.class)
@ExtendWith(OutputCaptureExtension.class)
class FailuresTests {

    @Autowired
    MockMvc browser;

    @Controller
    static class Failing {

        @GetMapping({"/fails/{how}", "/api/fails/{how}"})
        String fail(@PathVariable String how) {
            throw switch (how) {
                case "gone" -> new ResponseStatusException(HttpStatus.NOT_FOUND, "secret");
                case "bad" -> new ResponseStatusException(HttpStatus.BAD_REQUEST, "secret");
                case "conflict" -> new OptimisticLockingFailureException("secret");
                case "large" -> new MaxUploadSizeExceededException(1);
                case "forbidden" -> new AccessDeniedException("secret");
                default -> new IllegalStateException("secret");
            };
        }

        @GetMapping("/numbered/{number}")
        String number(@PathVariable int number) {
            return "redirect:/" + number;
        }
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            path            | status | says
            /fails/gone     | 404    | There is no such page
            /nowhere        | 404    | Look the child up by name
            /numbered/abc   | 404    | There is no such page
            /fails/conflict | 409    | Someone else saved this first
            /fails/large    | 413    | That file is too large
            /fails/bad      | 400    | That request could not be read
            /fails/crash    | 500    | Something went wrong on our side
            """)
    void aPersonReadsWhatHappenedAndHasAWayBack(String path, int status, String says) throws Exception {
        get(path, "STAFF")
                .andExpect(status().is(status))
                .andExpect(content().string(containsString(says)))
                .andExpect(content().string(containsString("href=\"/\"")))
                .andExpect(content().string(not(containsString("secret"))))
                .andExpect(content().string(not(containsString("??"))));
    }

    @Test
    void theReportNumberOnThePageFindsTheCauseInTheLog(CapturedOutput log) throws Exception {
        String page = get("/fails/crash", "STAFF").andReturn().getResponse().getContentAsString();
        String number = page.replaceAll("(?s).*Report ([0-9]{8}-[0-9]{4}-[0-9a-f]{4}).*", "$1");
        assertThat(log.getOut())
                .contains("Report " + number + ": GET /fails/crash")
                .contains("IllegalStateException: secret");
    }

    @Test
    void aRefusalWithinAPageStaysWithSecurity() throws Exception {
        get("/fails/forbidden", "STAFF").andExpect(status().isForbidden());
    }

    @Test
    void theLayoutOffersOnlyWhatTheAccountMayOpen() throws Exception {
        get("/nowhere", "DOCTOR")
                .andExpect(content()
                        .string(allOf(
                                containsString("Needs a look"),
                                containsString(">someone<"),
                                not(containsString("Bring in, take out")))));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            path                | status | detail
            /api/fails/gone     | 404    | There is nothing at this address.
            /api/fails/conflict | 409    | Someone else saved this first. Nothing was overwritten; read it again and repeat.
            /api/fails/large    | 413    | The file is too large; nothing was stored. At most 20 MB.
            """)
    void aProgramReadsProblemDetails(String path, int status, String detail) throws Exception {
        get(path, "MACHINE")
                .andExpect(status().is(status))
                .andExpect(content().contentType("application/problem+json"))
                .andExpect(jsonPath("$.status").value(status))
                .andExpect(jsonPath("$.instance").value(path))
                .andExpect(jsonPath("$.detail").value(detail));
    }

    @Test
    void aProgramIsGivenTheReportNumberAndNoExceptionText() throws Exception {
        get("/api/fails/crash", "MACHINE")
                .andExpect(status().isInternalServerError())
                .andExpect(jsonPath("$.reference").value(matchesPattern("[0-9]{8}-[0-9]{4}-[0-9a-f]{4}")))
                .andExpect(content().string(not(containsString("secret"))));
    }

    private ResultActions get(String path, String role) throws Exception {
        return browser.perform(
                MockMvcRequestBuilders.get(path).with(user("someone").roles(role)));
    }
}
