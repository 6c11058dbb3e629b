package plusward.people;

import java.util.Set;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.springframework.beans.factory.SmartInitializingSingleton;
import org.springframework.beans.factory.annotation.Value;
import org.springframework.stereotype.Component;

/**
 * Makes the first administrator from {@code PLUSWARD_ADMIN_NAME} and {@code PLUSWARD_ADMIN_PASSWORD}, before the first
 * request is served, and only where there is no account yet.
 */
@Component
class UnattendedAdministrator implements SmartInitializingSingleton {

    private static final Logger LOG = LoggerFactory.getLogger(UnattendedAdministrator.class);

    private final Accounts accounts;
    private final String name;
    private final String password;

    UnattendedAdministrator(
            Accounts accounts,
            @Value("${PLUSWARD_ADMIN_NAME:}") String name,
            @Value("${PLUSWARD_ADMIN_PASSWORD:}") String password) {
        this.accounts = accounts;
        this.name = name;
        this.password = password;
    }

    @Override
    public void afterSingletonsInstantiated() {
        if (name.isBlank() || password.isBlank() || !accounts.isEmpty()) {
            return;
        }
        if (password.length() < Passphrase.SHORTEST) {
            LOG.warn("PLUSWARD_ADMIN_PASSWORD is shorter than {} characters: change it soon", Passphrase.SHORTEST);
        }
        accounts.add(name, name, password, Set.of(Role.ADMINISTRATOR));
    }
}
