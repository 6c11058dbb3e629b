package plusward.journeys;

import com.microsoft.playwright.Page;
import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.test.context.ActiveProfiles;
import org.springframework.test.context.TestPropertySource;

/** The whole application with the demonstration clinic, on a port of its own and a database in memory. */
@Target(ElementType.TYPE)
@Retention(RetentionPolicy.RUNTIME)
@SpringBootTest(webEnvironment = SpringBootTest.WebEnvironment.RANDOM_PORT)
@ActiveProfiles("demo")
@TestPropertySource(properties = "spring.datasource.url=jdbc:h2:mem:journeys;DB_CLOSE_DELAY=-1")
@interface DemonstrationClinic {

    /** What a person does to get in. */
    final class SignIn {

        private SignIn() {}

        static void asDoctor(Page page, String address) {
            as(page, address, "doctor", "quiet lens evening");
        }

        static void asStaff(Page page, String address) {
            as(page, address, "staff", "plain glass morning");
        }

        static void asAdministrator(Page page, String address) {
            as(page, address, "admin", "round table garden");
        }

        private static void as(Page page, String address, String name, String password) {
            page.navigate(address + "/sign-in");
            page.locator("[name=username]").fill(name);
            page.locator("[name=password]").fill(password);
            page.locator("main button[type=submit]").click();
            page.waitForURL(url -> !url.contains("/sign-in"));
        }
    }
}
