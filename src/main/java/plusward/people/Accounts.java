package plusward.people;

import java.util.List;
import java.util.Set;
import org.springframework.security.core.userdetails.UserDetails;
import org.springframework.security.core.userdetails.UserDetailsService;
import org.springframework.security.core.userdetails.UsernameNotFoundException;
import org.springframework.security.crypto.password.PasswordEncoder;
import org.springframework.stereotype.Service;
import org.springframework.transaction.annotation.Transactional;

/** Makes accounts and finds them. */
@Service
class Accounts implements UserDetailsService {

    private final AccountRepository repository;
    private final PasswordEncoder passwords;
    private volatile boolean known;

    Accounts(AccountRepository repository, PasswordEncoder passwords) {
        this.repository = repository;
        this.passwords = passwords;
    }

    @Override
    @Transactional(readOnly = true)
    public UserDetails loadUserByUsername(String name) {
        return repository
                .findByName(Account.normal(name))
                .map(Person::new)
                .orElseThrow(() -> new UsernameNotFoundException("no such account"));
    }

    /** True while nobody can sign in. Accounts are closed, never removed, so the answer turns once. */
    @Transactional(readOnly = true)
    public boolean isEmpty() {
        known = known || repository.count() > 0;
        return !known;
    }

    @Transactional(readOnly = true)
    public List<Account> all() {
        return repository.findAllByOrderByName();
    }

    @Transactional(readOnly = true)
    public boolean has(String name) {
        return repository.findByName(Account.normal(name)).isPresent();
    }

    @Transactional
    public void add(String name, String displayName, String password, Set<Role> roles) {
        String hash = String.valueOf(passwords.encode(password));
        repository.save(new Account(name, displayName, hash, roles));
    }
}
