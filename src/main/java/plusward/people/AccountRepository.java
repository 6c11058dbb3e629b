package plusward.people;

import java.util.List;
import java.util.Optional;
import org.springframework.data.repository.Repository;

interface AccountRepository extends Repository<Account, Long> {

    Account save(Account account);

    long count();

    Optional<Account> findByName(String name);

    List<Account> findAllByOrderByName();
}
