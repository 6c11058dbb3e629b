package plusward.people;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.springframework.beans.factory.ObjectProvider;
import org.springframework.dao.OptimisticLockingFailureException;
import org.springframework.security.core.userdetails.UserDetails;
import org.springframework.security.core.userdetails.UserDetailsService;
import org.springframework.security.core.userdetails.UsernameNotFoundException;
import org.springframework.security.crypto.password.PasswordEncoder;
import org.springframework.session.FindByIndexNameSessionRepository;
import org.springframework.stereotype.Service;
import org.springframework.transaction.annotation.Transactional;

/** Makes accounts and finds them. */
@Service
class Accounts implements UserDetailsService {

    private final AccountRepository repository;
    private final PasswordEncoder passwords;
    private final ObjectProvider<FindByIndexNameSessionRepository<?>> sessions;
    private volatile boolean known;

    Accounts(
            AccountRepository repository,
            PasswordEncoder passwords,
            ObjectProvider<FindByIndexNameSessionRepository<?>> sessions) {
        this.sessions = sessions;
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
    public Optional<Account> find(String name) {
        return repository.findByName(Account.normal(name));
    }

    @Transactional(readOnly = true)
    public boolean has(String name) {
        return find(name).isPresent();
    }

    /** True when after this change no open account could administer the others. */
    @Transactional(readOnly = true)
    public boolean wouldLockOut(Account account, AccountForm form) {
        boolean stays = !form.isClosed() && form.getRoles().contains(Role.ADMINISTRATOR);
        return account.isOpenAdministrator()
                && !stays
                && repository.findAllByOrderByName().stream()
                        .filter(Account::isOpenAdministrator)
                        .allMatch(each -> each.name().equals(account.name()));
    }

    @Transactional
    public void add(String name, String displayName, String password, Set<Role> roles) {
        String hash = String.valueOf(passwords.encode(password));
        repository.save(new Account(name, displayName, hash, roles));
    }

    /**
     * Changes an account and ends its sessions, so that the change holds at once.
     *
     * @throws OptimisticLockingFailureException when it was changed since the form was shown
     */
    @Transactional
    public void change(String name, AccountForm form) {
        Account account = find(name).orElseThrow();
        if (!Integer.valueOf(account.version()).equals(form.getVersion())) {
            throw new OptimisticLockingFailureException("account " + account.name());
        }
        account.change(form.getDisplayName(), form.getRoles(), form.isClosed());
        if (!form.getPassword().isEmpty()) {
            account.changePassword(String.valueOf(passwords.encode(form.getPassword())));
        }
        repository.save(account);
        sessions.ifAvailable(
                all -> all.findByPrincipalName(account.name()).keySet().forEach(all::deleteById));
    }
}
