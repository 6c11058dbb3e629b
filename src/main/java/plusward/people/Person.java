package plusward.people;

import java.util.List;
import org.springframework.security.core.authority.SimpleGrantedAuthority;
import org.springframework.security.core.userdetails.User;
import plusward.web.SignedIn;

/** The account that is signed in, as the session keeps it. */
final class Person extends User implements SignedIn {

    private static final long serialVersionUID = 1L;

    private final String displayName;

    Person(Account account) {
        super(account.name(), account.passwordHash(), !account.isClosed(), true, true, true, authorities(account));
        this.displayName = account.displayName();
    }

    @Override
    public String displayName() {
        return displayName;
    }

    private static List<SimpleGrantedAuthority> authorities(Account account) {
        return account.roles().stream()
                .map(role -> new SimpleGrantedAuthority("ROLE_" + role))
                .toList();
    }
}
