package plusward.people;

import jakarta.validation.constraints.NotBlank;
import jakarta.validation.constraints.Pattern;
import jakarta.validation.constraints.Size;
import java.util.EnumSet;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/** An account as it is typed. */
class AccountForm {

    /** Letters, digits, dot, dash and underscore, from 2 to 60. */
    static final String NAME = "\\s*[A-Za-z0-9._-]{2,60}\\s*";

    @Pattern(regexp = NAME, message = "{people.name.refused}")
    private String name = "";

    @NotBlank(message = "{people.display-name.missing}")
    @Size(max = 80, message = "{people.display-name.long}")
    private String displayName = "";

    private String password = "";
    private Set<Role> roles = EnumSet.noneOf(Role.class);
    private boolean closed;
    private @Nullable Integer version;

    /** The form of an account that exists; its password stays when none is typed. */
    static AccountForm of(Account account) {
        AccountForm form = new AccountForm();
        form.name = account.name();
        form.displayName = account.displayName();
        form.roles = account.roles();
        form.closed = account.isClosed();
        form.version = account.version();
        return form;
    }

    public String getName() {
        return name;
    }

    public void setName(String name) {
        this.name = name;
    }

    public String getDisplayName() {
        return displayName;
    }

    public void setDisplayName(String displayName) {
        this.displayName = displayName;
    }

    public String getPassword() {
        return password;
    }

    public void setPassword(String password) {
        this.password = password;
    }

    public Set<Role> getRoles() {
        return roles;
    }

    public void setRoles(Set<Role> roles) {
        this.roles = roles;
    }

    public boolean isClosed() {
        return closed;
    }

    public void setClosed(boolean closed) {
        this.closed = closed;
    }

    public @Nullable Integer getVersion() {
        return version;
    }

    public void setVersion(@Nullable Integer version) {
        this.version = version;
    }
}
