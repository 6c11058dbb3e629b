package plusward.course;

import plusward.exam.Reason;
import plusward.optics.PrismPerDioptre;

/** An AC/A ratio with its 95 % interval and the readings it came from. Two methods are never put on one line. */
public record AcaEstimate(Estimate<PrismPerDioptre> ratio, Reason from) {}
