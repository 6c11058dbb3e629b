package plusward.people;

import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.not;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.get;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.content;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.header;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.status;

import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.test.web.servlet.MockMvc;
import plusward.web.PageSlice;

@PageSlice(SignInController.class)
class SignInPageTests {

    @Autowired
    MockMvc browser;

    @Test
    void isOpenToEveryoneAndSpeaksThroughTheBundles() throws Exception {
        browser.perform(get("/sign-in"))
                .andExpect(status().isOk())
                .andExpect(content().string(containsString("<title>Sign in</title>")))
                .andExpect(content().string(containsString("Your clinic")))
                .andExpect(content().string(containsString("not a diagnosis or an order")))
                .andExpect(content().string(containsString("name=\"_csrf\"")))
                .andExpect(content().string(not(containsString("??"))));
    }

    @Test
    void sendsAPolicyThatAllowsNothingInlineOrFromOutside() throws Exception {
        browser.perform(get("/sign-in"))
                .andExpect(header().string(
                                "Content-Security-Policy",
                                "default-src 'self'; object-src 'none'; base-uri 'self'; form-action 'self';"
                                        + " frame-ancestors 'none'"))
                .andExpect(header().string("Referrer-Policy", "same-origin"))
                .andExpect(header().string("X-Content-Type-Options", "nosniff"))
                .andExpect(header().string("X-Frame-Options", "DENY"))
                .andExpect(content().string(not(containsString("<style"))))
                .andExpect(content().string(not(containsString(" style="))));
    }
}
