package plusward.exchange;

import java.time.LocalDate;
import java.util.Map;
import plusward.exam.Examination;

/**
 * What the clinic has of the children that a file pair mentions.
 *
 * @param children by clinic number
 * @param visits by clinic number and date
 */
record StoredClinic(Map<String, ChildFacts> children, Map<String, Map<LocalDate, Examination>> visits) {

    Map<LocalDate, Examination> visitsOf(String clinicNumber) {
        return visits.getOrDefault(clinicNumber, Map.of());
    }
}
