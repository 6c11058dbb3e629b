package plusward.child;

import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.Collection;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import org.springframework.data.domain.Page;
import org.springframework.data.domain.PageRequest;
import org.springframework.orm.ObjectOptimisticLockingFailureException;
import org.springframework.stereotype.Service;
import org.springframework.transaction.annotation.Transactional;

/** The register of children: the door of this feature. */
@Service
public class Children {

    /** How many children a page of the list shows. */
    static final int PAGE = 50;

    private final ChildRepository repository;

    Children(ChildRepository repository) {
        this.repository = repository;
    }

    @Transactional(readOnly = true)
    public Optional<ChildCard> find(long id) {
        return repository.findById(id).map(Child::card);
    }

    @Transactional(readOnly = true)
    public Optional<ChildCard> findByClinicNumber(String clinicNumber) {
        return repository.findByClinicNumber(clinicNumber).map(Child::card);
    }

    /** The children that have one of these clinic numbers, by that number. */
    @Transactional(readOnly = true)
    public Map<String, ChildCard> withClinicNumbers(Collection<String> clinicNumbers) {
        return repository.findByClinicNumberIn(clinicNumbers).stream()
                .map(Child::card)
                .collect(Collectors.toMap(ChildCard::clinicNumber, Function.identity()));
    }

    /** All children by family name. */
    @Transactional(readOnly = true)
    public List<ChildCard> all() {
        return repository.findAllByName().stream().map(Child::card).toList();
    }

    /**
     * The children whose name or clinic number contains the text, or who were born on that day, by family name.
     *
     * @param page counts from 0
     */
    @Transactional(readOnly = true)
    public Page<ChildCard> search(String text, int page) {
        String plain = text.replaceAll("[\\p{Cntrl},]+", " ").strip().replaceAll("\\s+", " ");
        String part = plain.toLowerCase(Locale.ROOT).replaceAll("([!%_])", "!$1");
        return repository
                .search("%" + part + "%", day(plain), PageRequest.of(page, PAGE))
                .map(Child::card);
    }

    /**
     * Registers a child.
     *
     * @throws org.springframework.dao.DataIntegrityViolationException when the clinic number is taken
     */
    @Transactional
    public ChildCard add(ChildDetails details) {
        return repository.saveAndFlush(new Child(details)).card();
    }

    /**
     * Corrects what is written down of a child.
     *
     * @param version the version that was corrected
     * @throws org.springframework.dao.OptimisticLockingFailureException when it was changed since, or is gone
     * @throws org.springframework.dao.DataIntegrityViolationException when the clinic number is taken
     */
    @Transactional
    public ChildCard update(long id, int version, ChildDetails details) {
        Child child = repository
                .findById(id)
                .filter(each -> each.isAt(version))
                .orElseThrow(() -> new ObjectOptimisticLockingFailureException(Child.class, id));
        child.become(details);
        return repository.saveAndFlush(child).card();
    }

    /** Stores many at once: a child whose clinic number is known is corrected, the others are new. */
    @Transactional
    public void bringIn(Collection<ChildDetails> children) {
        List<String> numbers = children.stream().map(ChildDetails::clinicNumber).toList();
        Map<String, Child> known = repository.findByClinicNumberIn(numbers).stream()
                .collect(Collectors.toMap(Child::clinicNumber, Function.identity()));
        List<Child> rows = children.stream()
                .map(details -> row(details, known.get(details.clinicNumber())))
                .toList();
        repository.saveAll(rows);
        repository.flush();
    }

    private static Child row(ChildDetails details, @Nullable Child known) {
        if (known == null) {
            return new Child(details);
        }
        known.become(details);
        return known;
    }

    private static @Nullable LocalDate day(String text) {
        try {
            return LocalDate.parse(text);
        } catch (DateTimeParseException notADay) {
            return null;
        }
    }
}
