package plusward.people;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.TestConfiguration;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Import;
import org.springframework.security.crypto.factory.PasswordEncoderFactories;
import org.springframework.security.crypto.password.PasswordEncoder;
import org.springframework.test.context.ActiveProfiles;
import plusward.web.DatabaseSlice;

@DatabaseSlice
@ActiveProfiles("demo")
@Import({Accounts.class, DemonstrationAccounts.class, Welcome.class, OneTimeCode.class})
class DemonstrationAccountsTests {

    @TestConfiguration
    static class Passwords {

        @Bean
        PasswordEncoder passwordEncoder() {
            return PasswordEncoderFactories.createDelegatingPasswordEncoder();
        }
    }

    @Autowired
    Accounts accounts;

    @Autowired
    DemonstrationAccounts demonstration;

    @Autowired
    Welcome welcome;

    @Autowired
    PasswordEncoder passwords;

    @Test
    void areMadeOnceWithLongPasswordsStoredAsHashes() {
        demonstration.afterSingletonsInstantiated();
        assertThat(accounts.all()).extracting(Account::name).containsExactly("admin", "doctor", "machine", "staff");
        for (DemonstrationAccounts.Known known : DemonstrationAccounts.ALL) {
            String stored = accounts.loadUserByUsername(known.name()).getPassword();
            assertThat(known.password().length()).isGreaterThanOrEqualTo(Passphrase.SHORTEST);
            assertThat(stored).startsWith("{bcrypt}").doesNotContain(known.password());
            assertThat(passwords.matches(known.password(), stored)).isTrue();
        }
    }

    @Test
    void arePrintedWithTheAddress() {
        assertThat(welcome.text())
                .contains("the demonstration clinic. Open http://localhost:")
                .contains("staff     plain glass morning")
                .contains("Do not enter real children here");
    }
}
