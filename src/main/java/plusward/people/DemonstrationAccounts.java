package plusward.people;

import java.util.List;
import java.util.Set;
import org.springframework.beans.factory.SmartInitializingSingleton;
import org.springframework.context.annotation.Profile;
import org.springframework.stereotype.Component;

/** The accounts of the demonstration clinic, made when they are absent. The people are invented. */
@Component
@Profile("demo")
class DemonstrationAccounts implements SmartInitializingSingleton {

    /** An account whose password everyone may know. */
    record Known(String name, String displayName, String password, Role role) {}

    static final List<Known> ALL = List.of(
            new Known("staff", "R. Tamsin, orthoptist", "plain glass morning", Role.STAFF),
            new Known("doctor", "Dr. O. Vellacott", "quiet lens evening", Role.DOCTOR),
            new Known("admin", "P. Quillfeather, administrator", "round table garden", Role.ADMINISTRATOR),
            new Known("machine", "Machine door", "steady wheel turning", Role.MACHINE));

    private final Accounts accounts;

    DemonstrationAccounts(Accounts accounts) {
        this.accounts = accounts;
    }

    @Override
    public void afterSingletonsInstantiated() {
        ALL.stream()
                .filter(each -> !accounts.has(each.name()))
                .forEach(each -> accounts.add(each.name(), each.displayName(), each.password(), Set.of(each.role())));
    }
}
