package plusward.visit;

import java.time.LocalDate;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import org.springframework.data.repository.Repository;

interface VisitRepository extends Repository<VisitRow, Long> {

    VisitRow saveAndFlush(VisitRow visit);

    <S extends VisitRow> List<S> saveAll(Iterable<S> visits);

    void flush();

    Optional<VisitRow> findByIdAndChildId(long id, long childId);

    Optional<VisitRow> findByChildIdAndVisitDate(long childId, LocalDate visitDate);

    List<VisitRow> findByChildIdOrderByVisitDate(long childId);

    List<VisitRow> findByChildIdIn(Collection<Long> childIds);

    List<VisitRow> findAll();
}
