package plusward.child;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.not;
import static org.mockito.ArgumentMatchers.any;
import static org.mockito.ArgumentMatchers.anyInt;
import static org.mockito.ArgumentMatchers.anyLong;
import static org.mockito.ArgumentMatchers.anyString;
import static org.mockito.Mockito.never;
import static org.mockito.Mockito.verify;
import static org.mockito.Mockito.when;
import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.csrf;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.get;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.post;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.content;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.redirectedUrl;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.status;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.dao.DataIntegrityViolationException;
import org.springframework.dao.OptimisticLockingFailureException;
import org.springframework.data.domain.PageImpl;
import org.springframework.data.domain.PageRequest;
import org.springframework.security.test.context.support.WithMockUser;
import org.springframework.test.context.bean.override.mockito.MockitoBean;
import org.springframework.test.web.servlet.MockMvc;
import org.springframework.test.web.servlet.request.MockHttpServletRequestBuilder;
import org.springframework.web.util.HtmlUtils;
import plusward.web.PageSlice;

@PageSlice(ChildController.class)
@WithMockUser(roles = "STAFF")
class ChildPagesTests {

    private static final String NEW = "/children/new";
    private static final String EDIT = "/children/7/edit";
    private static final ChildCard MARA =
            new ChildCard(7, "A-1007", "Mara", "Ellwood", LocalDate.parse("2019-05-02"), 30, "es", null, 4);

    @Autowired
    MockMvc browser;

    @MockitoBean
    Children children;

    @BeforeEach
    void oneChild() {
        when(children.find(7)).thenReturn(Optional.of(MARA));
        when(children.search(anyString(), anyInt()))
                .thenReturn(new PageImpl<>(List.of(MARA), PageRequest.of(1, 50), 130));
    }

    private static MockHttpServletRequestBuilder good(String path) {
        return post(path).param("clinicNumber", "A-1024").param("bornOn", "2021-02-28");
    }

    private String page(MockHttpServletRequestBuilder request, int status) throws Exception {
        return browser.perform(request.with(csrf()))
                .andExpect(status().is(status))
                .andExpect(content().string(not(containsString("??"))))
                .andReturn()
                .getResponse()
                .getContentAsString();
    }

    @Test
    void listsChildrenWithAWayToEachAndToTheOtherPages() throws Exception {
        assertThat(page(get("/children").param("q", "el <b>"), 200))
                .contains("130 children found")
                .contains("Ellwood, Mara")
                .contains("href=\"/children/7\"")
                .contains("href=\"/children/7/visits/new\"")
                .contains("value=\"el &lt;b&gt;\"")
                .contains("page=0")
                .contains("page=2");
    }

    @ParameterizedTest
    @ValueSource(strings = {"-1", "99999999", "0"})
    void anyPageNumberIsAnswered(String number) throws Exception {
        page(get("/children").param("page", number), 200);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
        # field             | typed
        clinicNumber        | A 1024
        clinicNumber        | A-10241024102410241024
        clinicNumber        | <b>
        bornOn              | 2021-02-31
        bornOn              | 31/1/2021
        bornOn              | 1899-12-31
        bornOn              | 2199-01-01
        bornOn              | 99999-01-01
        turnFirstSeenMonths | 217
        turnFirstSeenMonths | -1
        turnFirstSeenMonths | 2.5
        turnFirstSeenMonths | ٣
        """)
    void whatCannotBeTrueIsRefusedAndKept(String field, String typed) throws Exception {
        String page = page(
                post(NEW)
                        .param("clinicNumber", field.equals("clinicNumber") ? typed : "A-1")
                        .param("bornOn", field.equals("bornOn") ? typed : "2021-02-28")
                        .param("turnFirstSeenMonths", field.startsWith("turn") ? typed : ""),
                200);
        assertThat(page)
                .contains("<title>Error: Add a child</title>")
                .contains("role=\"alert\" tabindex=\"-1\" id=\"errors\"")
                .contains("href=\"#" + field + "\"")
                .contains("value=\"" + HtmlUtils.htmlEscape(typed, "UTF-8") + "\"")
                .containsPattern("id=\"" + field + "-wrong\">[^<]*(type|Type) [^<]*for example");
        verify(children, never()).add(any());
    }

    @ParameterizedTest
    @ValueSource(strings = {"givenName", "familyName", "note"})
    void textWithControlCharactersOrWithoutEndIsRefused(String field) throws Exception {
        assertThat(page(good(NEW).param(field, "a\u0000b"), 200)).contains("href=\"#" + field + "\"");
        assertThat(page(good(NEW).param(field, "x".repeat(1_000_000)), 200)).contains("href=\"#" + field + "\"");
        verify(children, never()).add(any());
    }

    @Test
    void everythingThatIsWrongIsSaidAtOnceInTheOrderOfThePage() throws Exception {
        assertThat(page(post(NEW).param("note", "\u0007").param("handoutLanguage", "xx"), 200))
                .containsSubsequence("#clinicNumber", "#bornOn", "#handoutLanguage", "#note");
    }

    @ParameterizedTest
    @CsvSource({"'', /children/9", "visit, /children/9/visits/new"})
    void anAddedChildLeadsToItsCourseOrItsFirstVisit(String then, String path) throws Exception {
        ChildDetails details =
                new ChildDetails("A-1024", "נל", null, LocalDate.parse("2021-02-28"), null, "en", "one\ntwo");
        when(children.add(details))
                .thenReturn(new ChildCard(9, "A-1024", null, null, details.bornOn(), null, "en", null, 0));
        browser.perform(good(NEW)
                        .param("givenName", " נל ")
                        .param("note", "one\r\ntwo")
                        .param("then", then)
                        .with(csrf()))
                .andExpect(redirectedUrl(path));
    }

    @Test
    void aNumberThatIsTakenIsSaid() throws Exception {
        when(children.add(any())).thenThrow(new DataIntegrityViolationException("child_clinic_number_unique"));
        assertThat(page(good(NEW), 200))
                .contains("another child has this number")
                .contains("value=\"A-1024\"");
    }

    @Test
    void anOvertakenCorrectionShowsWhatIsStoredAndKeepsWhatWasTyped() throws Exception {
        when(children.update(anyLong(), anyInt(), any())).thenThrow(new OptimisticLockingFailureException("late"));
        assertThat(page(good(EDIT).param("version", "3"), 409))
                .contains("Someone else changed this child")
                .contains("A-1007")
                .contains("value=\"A-1024\"")
                .contains("name=\"version\" value=\"4\"");
    }

    @Test
    void aCorrectionCarriesTheVersionThatWasRead() throws Exception {
        assertThat(page(get(EDIT), 200))
                .contains("name=\"version\" value=\"4\"")
                .contains("value=\"A-1007\"");
        browser.perform(good(EDIT).param("version", "4").with(csrf())).andExpect(redirectedUrl("/children/7"));
        LocalDate born = LocalDate.parse("2021-02-28");
        verify(children).update(7, 4, new ChildDetails("A-1024", null, null, born, null, "en", null));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "x", "99999999999"})
    void aVersionThatCannotBeReadStoresNothingOverAnother(String version) throws Exception {
        when(children.update(anyLong(), anyInt(), any())).thenThrow(new OptimisticLockingFailureException("none"));
        browser.perform(good(EDIT).param("version", version).with(csrf()))
                .andExpect(status().is(version.isEmpty() ? 409 : 200))
                .andExpect(content().string(containsString("role=\"alert\"")));
    }

    @ParameterizedTest
    @ValueSource(strings = {"/children/8/edit", "/children/x/edit", "/children/99999999999999999999/edit"})
    void whatDoesNotExistIsAPageWithAWayBack(String path) throws Exception {
        assertThat(page(get(path), 404)).contains("There is no such page");
    }
}
