package plusward.rules;

import java.util.Optional;
import java.util.stream.Stream;
import plusward.course.Visit;
import plusward.exam.Eye;
import plusward.exam.LensMeasure;
import plusward.exam.PerEye;
import plusward.exam.Reason;
import plusward.optics.Dioptres;
import plusward.optics.Lens;

/** Lenses that look as if a sign or the eyes had been exchanged while they were written down. */
final class SuspectLenses {

    /** A sign may be a slip where both spheres have this power, 1.00 D: a plano beside a weak lens is no surprise. */
    private static final Limit<Dioptres> STRONG = Limit.atLeast(Dioptres.of(1.00));

    /** Exchanged eyes are within this of the other eye's earlier lens, 0.50 D as a difference of power vectors. */
    private static final Limit<Dioptres> ALIKE = Limit.atMost(Dioptres.of(0.50));

    /** And an eye is this far from its own, 1.00 D. */
    private static final Limit<Dioptres> FAR = Limit.atLeast(Dioptres.of(1.00));

    private SuspectLenses() {}

    /** A sphere of the other sign than the last time this measure was taken in this eye. */
    static Stream<Suspicion> signsFlipped(Visit visit) {
        return Stream.of(LensMeasure.values())
                .flatMap(measure -> Stream.of(Eye.values()).flatMap(eye -> signFlipped(visit, measure, eye).stream()));
    }

    private static Optional<Suspicion> signFlipped(Visit visit, LensMeasure measure, Eye eye) {
        return measure.in(visit.exam(), eye)
                .flatMap(now -> visit.lastBefore(
                                each -> measure.in(each.exam(), eye).isPresent())
                        .filter(then -> measure.in(then.exam(), eye)
                                .filter(lens -> isOpposite(lens, now))
                                .isPresent())
                        .map(then -> {
                            Reason why = Reason.of(
                                    "suspicion.sign-flipped",
                                    now,
                                    measure.in(then.exam(), eye).orElseThrow(),
                                    then.date());
                            return new Suspicion("sign-flipped", measure.field(eye), now.toString(), why);
                        }));
    }

    private static boolean isOpposite(Lens one, Lens other) {
        Dioptres first = one.inMinusCylinder().sphere();
        Dioptres second = other.inMinusCylinder().sphere();
        return first.amount() * second.amount() < 0 && isStrong(first) && isStrong(second);
    }

    private static boolean isStrong(Dioptres sphere) {
        return !STRONG.isCrossedBy(sphere.size());
    }

    /** Right and left as the other eye had it last time, or on the lensmeter as the other eye should have it. */
    static Stream<Suspicion> sidesExchanged(Visit visit) {
        Stream<Suspicion> sinceLastTime = Stream.of(LensMeasure.values())
                .flatMap(measure -> visit
                        .lastBefore(each -> measure.in(each.exam()).isComplete())
                        .flatMap(then -> exchanged(measure.in(visit.exam()), measure.in(then.exam())))
                        .map(lenses -> suspicion(measure, lenses, "suspicion.sides-exchanged"))
                        .stream());
        Stream<Suspicion> onTheLensmeter =
                exchanged(LensMeasure.MADE.in(visit.exam()), LensMeasure.WORN.in(visit.exam()))
                        .map(lenses -> suspicion(LensMeasure.MADE, lenses, "suspicion.sides-exchanged-made"))
                        .stream();
        return Stream.concat(sinceLastTime, onTheLensmeter);
    }

    private static Optional<PerEye<Lens>> exchanged(PerEye<Lens> now, PerEye<Lens> then) {
        return Optional.of(now).filter(pair -> isFar(pair, then) && isAlike(pair, then.swapped()));
    }

    private static boolean isFar(PerEye<Lens> now, PerEye<Lens> then) {
        return apart(now, then).anyMatch(distance -> !FAR.isCrossedBy(distance));
    }

    private static boolean isAlike(PerEye<Lens> now, PerEye<Lens> then) {
        return apart(now, then).filter(distance -> !ALIKE.isCrossedBy(distance)).count() == 2;
    }

    /** How far each eye's lens is from the other pair's, for the eyes that have both. */
    private static Stream<Dioptres> apart(PerEye<Lens> one, PerEye<Lens> other) {
        return Stream.of(Eye.values())
                .flatMap(eye -> Optional.ofNullable(one.of(eye))
                        .flatMap(lens -> Optional.ofNullable(other.of(eye))
                                .map(against -> lens.powerVector().distanceTo(against.powerVector())))
                        .stream());
    }

    private static Suspicion suspicion(LensMeasure measure, PerEye<Lens> now, String key) {
        String both = now.right() + " / " + now.left();
        return new Suspicion("sides-exchanged", measure.field(Eye.RIGHT), both, Reason.of(key, both));
    }

    /** Cycloplegic refraction with less plus than the manifest one of the day, by more than the rulebook allows. */
    static Stream<Suspicion> underManifest(Visit visit) {
        return Stream.of(Eye.values())
                .filter(eye -> CycloplegiaDoubtful.isUnderManifest(visit, eye))
                .map(eye -> {
                    Lens found = LensMeasure.CYCLOPLEGIC.in(visit.exam(), eye).orElseThrow();
                    Lens manifest = LensMeasure.MANIFEST.in(visit.exam(), eye).orElseThrow();
                    Reason why = Reason.of(
                            "suspicion.under-manifest", found.sphericalEquivalent(), manifest.sphericalEquivalent());
                    return new Suspicion("under-manifest", LensMeasure.CYCLOPLEGIC.field(eye), found.toString(), why);
                });
    }
}
