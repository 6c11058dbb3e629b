package plusward.recall;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.Collection;
import java.util.List;
import plusward.child.ChildCard;
import plusward.draft.Draft;

/** A visit that the signed-in account began to type and did not save. */
record DraftRow(ChildCard child, Draft.Place place, LocalDateTime keptAt) {

    static List<DraftRow> of(List<Draft> drafts, Collection<ChildCard> children, ZoneId zone) {
        return drafts.stream()
                .flatMap(draft -> children.stream()
                        .filter(child -> child.id() == draft.place().childId())
                        .map(child ->
                                new DraftRow(child, draft.place(), LocalDateTime.ofInstant(draft.keptAt(), zone))))
                .toList();
    }

    /** The day of the visit that is corrected, or the day for which a new one was begun. */
    public LocalDate day() {
        return place.begunFor();
    }

    /** Where one goes on typing. */
    public String path() {
        String visits = "/children/" + child.id() + "/visits/";
        return place.isNew() ? visits + "new?day=" + day() : visits + place.visitId() + "/edit";
    }
}
