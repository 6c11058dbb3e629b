package plusward.entry;

import java.util.Arrays;
import java.util.List;
import plusward.child.ChildCard;
import plusward.exam.Examination;
import plusward.exam.ExaminationReader;
import plusward.exam.Field;
import plusward.visit.RecordedVisit;

/**
 * Two versions of a visit side by side: the one typed, and the one that someone else stored meanwhile.
 *
 * @param form what was typed
 * @param fields every field; those that differ are to be chosen
 */
record TwoVersions(ChildCard child, RecordedVisit stored, VisitForm form, List<Version> fields) {

    /** A field as typed and as stored. They differ when they mean different things, not when they are spelt differently. */
    record Version(String name, String typed, String stored, boolean differs) {

        /** What is chosen to begin with: what was typed, unless that would empty a field. */
        public boolean keepTyped() {
            return !typed.isBlank();
        }
    }

    static TwoVersions of(ChildCard child, RecordedVisit stored, VisitForm form) {
        Examination read = ExaminationReader.read(form.text()).examination();
        VisitForm mine = read == null ? form : VisitForm.of(read);
        VisitForm theirs = VisitForm.of(stored.examination());
        List<Version> fields = Arrays.stream(Field.values())
                .map(field -> new Version(
                        field.column(),
                        form.at(field),
                        theirs.at(field),
                        !mine.at(field).equals(theirs.at(field))))
                .toList();
        return new TwoVersions(child, stored, form, fields);
    }

    public List<Version> differing() {
        return fields.stream().filter(Version::differs).toList();
    }

    public List<Version> alike() {
        return fields.stream().filter(field -> !field.differs()).toList();
    }
}
