package plusward.people;

import java.util.Locale;
import java.util.stream.Collectors;
import org.springframework.boot.context.event.ApplicationReadyEvent;
import org.springframework.context.ApplicationListener;
import org.springframework.context.MessageSource;
import org.springframework.core.env.Environment;
import org.springframework.core.env.Profiles;
import org.springframework.stereotype.Component;

/** One block on the console once the application can be used: where to open it, and how to get in. */
@Component
class Welcome implements ApplicationListener<ApplicationReadyEvent> {

    private final Environment environment;
    private final MessageSource messages;
    private final Accounts accounts;
    private final OneTimeCode code;

    Welcome(Environment environment, MessageSource messages, Accounts accounts, OneTimeCode code) {
        this.environment = environment;
        this.messages = messages;
        this.accounts = accounts;
        this.code = code;
    }

    @Override
    public void onApplicationEvent(ApplicationReadyEvent event) {
        System.out.println("\n" + text().indent(2));
    }

    String text() {
        String address = "http://localhost:" + environment.getProperty("local.server.port", "8080") + "/";
        if (environment.acceptsProfiles(Profiles.of("demo"))) {
            return word("people.welcome.demo", address, knownAccounts());
        }
        return accounts.isEmpty()
                ? word("people.welcome.empty", address, code.printed())
                : word("people.welcome.ready", address);
    }

    private static String knownAccounts() {
        return DemonstrationAccounts.ALL.stream()
                .map(each -> String.format(Locale.ROOT, "  %-8s  %s", each.name(), each.password()))
                .collect(Collectors.joining("\n"));
    }

    private String word(String key, Object... values) {
        return messages.getMessage(key, values, Locale.ENGLISH);
    }
}
