package plusward.visit;

import java.util.List;
import plusward.exam.Examination;
import plusward.rules.Suspicion;

/**
 * A visit typed anew.
 *
 * @param visitId which visit
 * @param version the version that was read before it was corrected
 * @param examination the whole visit as it should stand; a measure that it lacks becomes "not measured"
 * @param why the reason in the words of whoever corrects; not blank
 * @param confirmed what was asked about and said to be right
 */
public record Correction(long visitId, int version, Examination examination, String why, List<Suspicion> confirmed) {

    public Correction {
        confirmed = List.copyOf(confirmed);
    }
}
