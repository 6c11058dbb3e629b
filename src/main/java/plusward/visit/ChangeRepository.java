package plusward.visit;

import java.util.List;
import org.springframework.data.repository.Repository;

interface ChangeRepository extends Repository<ChangeRow, Long> {

    <S extends ChangeRow> List<S> saveAll(Iterable<S> changes);

    List<ChangeRow> findByVisitIdOrderByIdDesc(long visitId);
}
