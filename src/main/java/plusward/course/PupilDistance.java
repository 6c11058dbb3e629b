package plusward.course;

import java.util.Map;
import java.util.TreeMap;
import plusward.optics.Age;
import plusward.optics.Millimetres;

/**
 * The usual distance between a child's pupils, where it was not measured.
 *
 * <p>Up to 5 years 46.5, 47.5, 49.5 and 51 mm at 1, 2, 3 and 4 to 5 years (thesis, Pacific University 1993, n = 220);
 * then 52, 54, 56, 58 and 60 mm at 6, 8, 10, 12 and 15 years (from memory). Straight lines between; constant outside.
 */
final class PupilDistance {

    private static final TreeMap<Double, Double> BY_AGE = new TreeMap<>(Map.of(
            1.0, 46.5, 2.0, 47.5, 3.0, 49.5, 4.0, 51.0, 5.0, 51.0, 6.0, 52.0, 8.0, 54.0, 10.0, 56.0, 12.0, 58.0, 15.0,
            60.0));

    private PupilDistance() {}

    static Millimetres usualAt(Age age) {
        Map.Entry<Double, Double> younger = BY_AGE.floorEntry(age.inYears());
        Map.Entry<Double, Double> older = BY_AGE.ceilingEntry(age.inYears());
        if (younger == null || older == null) {
            return Millimetres.of((younger == null ? BY_AGE.firstEntry() : BY_AGE.lastEntry()).getValue());
        }
        double span = older.getKey() - younger.getKey();
        double part = span == 0 ? 0 : (age.inYears() - younger.getKey()) / span;
        return Millimetres.of(younger.getValue() + part * (older.getValue() - younger.getValue()));
    }
}
