package plusward.entry;

import java.util.List;
import plusward.rules.Suspicion;
import plusward.visit.RecordedVisit;

/** What came of saving a typed visit. */
sealed interface Outcome {

    record Saved(RecordedVisit visit) implements Outcome {}

    /** Nothing was stored; all that is wrong. */
    record Refusals(List<Refused> all) implements Outcome {

        public Refusals {
            all = List.copyOf(all);
        }
    }

    /** Nothing was stored yet: what is possible but unlikely, and not yet said to be right. */
    record Doubts(List<Suspicion> all) implements Outcome {

        public Doubts {
            all = List.copyOf(all);
        }
    }

    /** Nothing was stored: the visit was changed since it was read. This is how it stands now. */
    record Overtaken(RecordedVisit stored) implements Outcome {}
}
