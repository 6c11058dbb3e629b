package plusward.course;

import plusward.optics.Age;
import plusward.optics.Dioptres;

/**
 * How hyperopia ran in published series of children with accommodative esotropia, to stand beside a child's own.
 *
 * <p>From 3 to 7 years +0.12 D a year when it began under +4.00 D, else 0.0; from 7 to 15 years −0.17 to −0.18 D a year
 * (Bonafede et al., Br J Ophthalmol 2020;104:1283, n = 405). After 7 years −0.24 D a year in another (Black 2006). Both are
 * given as a band; outside 3 to 15 years there is none.
 *
 * @param from the age at which the band begins
 * @param to the age at which it ends
 * @param slowest the change nearer to rising
 * @param fastest the change nearer to falling
 */
public record PublishedCourse(Age from, Age to, DioptresPerYear slowest, DioptresPerYear fastest) {

    private static final Dioptres MODERATE = Dioptres.of(4);

    /** The years from 3 to 7, by the hyperopia at their beginning. */
    public static PublishedCourse early(Dioptres baseline) {
        DioptresPerYear change = DioptresPerYear.of(baseline.isUnder(MODERATE) ? 0.12 : 0.0);
        return new PublishedCourse(Age.of(3), Age.of(7), change, change);
    }

    /** The years from 7 to 15. */
    public static PublishedCourse late() {
        return new PublishedCourse(Age.of(7), Age.of(15), DioptresPerYear.of(-0.17), DioptresPerYear.of(-0.24));
    }
}
