package plusward.child;

import java.time.LocalDate;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.springframework.data.domain.Page;
import org.springframework.data.domain.Pageable;
import org.springframework.data.jpa.repository.Query;
import org.springframework.data.repository.Repository;

interface ChildRepository extends Repository<Child, Long> {

    String BY_NAME = " order by lower(coalesce(c.familyName, c.givenName, c.clinicNumber)),"
            + " lower(coalesce(c.givenName, '')), c.clinicNumber, c.id";
    String NAMES = "lower(concat(coalesce(c.givenName, ''), ' ', coalesce(c.familyName, ''), ' ',"
            + " coalesce(c.givenName, '')))";

    Child saveAndFlush(Child child);

    <S extends Child> List<S> saveAll(Iterable<S> children);

    void flush();

    Optional<Child> findById(long id);

    Optional<Child> findByClinicNumber(String clinicNumber);

    List<Child> findByClinicNumberIn(Collection<String> clinicNumbers);

    @Query("select c from Child c" + BY_NAME)
    List<Child> findAllByName();

    /** Part of a name or of a clinic number, or the whole day of birth. */
    @Query("select c from Child c where " + NAMES + " like :part escape '!'"
            + " or lower(c.clinicNumber) like :part escape '!' or c.bornOn = :bornOn" + BY_NAME)
    Page<Child> search(String part, @Nullable LocalDate bornOn, Pageable page);
}
