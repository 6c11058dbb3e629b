package plusward.people;

import jakarta.persistence.CollectionTable;
import jakarta.persistence.Column;
import jakarta.persistence.ElementCollection;
import jakarta.persistence.Entity;
import jakarta.persistence.EnumType;
import jakarta.persistence.Enumerated;
import jakarta.persistence.FetchType;
import jakarta.persistence.GeneratedValue;
import jakarta.persistence.GenerationType;
import jakarta.persistence.Id;
import jakarta.persistence.JoinColumn;
import jakarta.persistence.Version;
import java.util.Collections;
import java.util.EnumSet;
import java.util.Locale;
import java.util.Set;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;

/** Someone, or a program, who may sign in. */
@Entity
class Account {

    @Id
    @GeneratedValue(strategy = GenerationType.IDENTITY)
    @SuppressWarnings("UnusedVariable") // read by the persistence framework
    private @Nullable Long id;

    @Version
    private int version;

    private String name = "";
    private String displayName = "";
    private String passwordHash = "";
    private boolean closed;

    @ElementCollection(fetch = FetchType.EAGER)
    @CollectionTable(name = "account_role", joinColumns = @JoinColumn(name = "account_id"))
    @Column(name = "role")
    @Enumerated(EnumType.STRING)
    private Set<Role> roles = EnumSet.noneOf(Role.class);

    /** For the persistence framework. */
    protected Account() {}

    Account(String name, String displayName, String passwordHash, Set<Role> roles) {
        this.name = normal(name);
        this.displayName = displayName.strip();
        this.passwordHash = passwordHash;
        this.roles = EnumSet.copyOf(roles);
    }

    /** Account names are compared without regard to case. */
    static String normal(String name) {
        return name.strip().toLowerCase(Locale.ROOT);
    }

    /** Everything but the name, which history refers to. */
    void change(String newDisplayName, Set<Role> newRoles, boolean nowClosed) {
        displayName = newDisplayName.strip();
        roles.clear();
        roles.addAll(newRoles);
        closed = nowClosed;
    }

    void changePassword(String newHash) {
        passwordHash = newHash;
    }

    int version() {
        return version;
    }

    String name() {
        return name;
    }

    String displayName() {
        return displayName;
    }

    String passwordHash() {
        return passwordHash;
    }

    boolean isClosed() {
        return closed;
    }

    Set<Role> roles() {
        return Collections.unmodifiableSet(new TreeSet<>(roles));
    }

    boolean isOpenAdministrator() {
        return !closed && roles.contains(Role.ADMINISTRATOR);
    }
}
