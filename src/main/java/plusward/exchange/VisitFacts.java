package plusward.exchange;

import plusward.exam.Examination;

/** A child's visit as a row of {@code visits.csv} gives it. */
record VisitFacts(String clinicNumber, Examination examination) {}
