package plusward.entry;

import java.time.LocalDate;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import plusward.exam.ExaminationWriter;
import plusward.exam.Field;
import plusward.visit.RecordedVisit;

/**
 * What stood in the fields at earlier visits. The fields of a row are always taken from one visit, the latest that has any
 * of them, so that right and left, or a lens and its add, are never put together from two.
 */
final class LastTime {

    private final List<Earlier> latestFirst;

    private LastTime(List<Earlier> latestFirst) {
        this.latestFirst = latestFirst;
    }

    /** An earlier visit, with what it has of the fields asked for. */
    record Earlier(RecordedVisit visit, Map<Field, String> text) {

        LocalDate date() {
            return visit.date();
        }

        private Earlier only(Collection<Field> fields) {
            Map<Field, String> some = text.entrySet().stream()
                    .filter(each -> fields.contains(each.getKey()))
                    .collect(Collectors.toMap(Map.Entry::getKey, Map.Entry::getValue));
            return new Earlier(visit, some);
        }
    }

    static LastTime of(List<RecordedVisit> visits) {
        return new LastTime(visits.stream()
                .sorted(Comparator.comparing(RecordedVisit::date).reversed())
                .map(visit -> new Earlier(visit, ExaminationWriter.write(visit.examination())))
                .toList());
    }

    /** The visit before; empty when there is none. */
    Optional<RecordedVisit> visit() {
        return latestFirst.stream().findFirst().map(Earlier::visit);
    }

    /** The latest visit that has any of these fields, with those it has. */
    Optional<Earlier> having(Collection<Field> fields) {
        return latestFirst.stream()
                .map(each -> each.only(fields))
                .filter(each -> !each.text().isEmpty())
                .findFirst();
    }

    /** The glasses of the latest visit that has some; a field that this visit lacks is empty. */
    Optional<Map<Field, String>> glasses() {
        return having(List.of(Field.WORN_RIGHT, Field.WORN_LEFT))
                .flatMap(found -> latestFirst.stream()
                        .filter(each -> each.visit().equals(found.visit()))
                        .findFirst())
                .map(each -> VisitForm.GLASSES.stream()
                        .collect(Collectors.toMap(
                                field -> field, field -> each.text().getOrDefault(field, ""))));
    }
}
