package plusward.review;

import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import plusward.course.AcaEstimate;
import plusward.course.CycloplegicInForce;
import plusward.course.Derived;
import plusward.course.GradientAca;
import plusward.course.HeterophoriaAca;
import plusward.course.Limits;
import plusward.course.SegmentPlace;
import plusward.course.Visit;
import plusward.course.Worn;
import plusward.exam.PerEye;
import plusward.exam.TurnCondition;
import plusward.optics.Millimetres;
import plusward.optics.PrismDioptres;
import plusward.review.CourseDocument.DerivedPart;
import plusward.review.CourseDocument.RatioPart;
import plusward.web.Sentences;

/** Writes what follows from a visit's measurements. */
final class DerivedParts {

    private final Sentences sentences;
    private final ModelParts models;

    DerivedParts(Sentences sentences) {
        this.sentences = sentences;
        this.models = new ModelParts(sentences);
    }

    DerivedPart of(Visit visit, Limits limits) {
        Derived derived = Derived.at(visit);
        CycloplegicInForce inForce = derived.inForce();
        PerEye<Millimetres> belowEdge =
                SegmentPlace.at(visit, limits).map(SegmentPlace::belowEdge).orElse(PerEye.none());
        return new DerivedPart(
                Numbers.orAbsent(derived.cycloplegic().right()),
                Numbers.orAbsent(derived.cycloplegic().left()),
                inForce == null ? null : inForce.takenOn(),
                Numbers.orAbsent(derived.manifest().right()),
                Numbers.orAbsent(derived.manifest().left()),
                Numbers.orAbsent(derived.worn().right()),
                Numbers.orAbsent(derived.worn().left()),
                Numbers.orAbsent(derived.latent().right()),
                Numbers.orAbsent(derived.latent().left()),
                Numbers.orAbsent(derived.shortBy().right()),
                Numbers.orAbsent(derived.shortBy().left()),
                turns(derived.turns()),
                derived.turnsTrue().entrySet().stream()
                        .collect(Collectors.toMap(turn -> name(turn.getKey()), turn -> Numbers.plain(turn.getValue()))),
                ratio(GradientAca.at(visit)),
                ratio(GradientAca.overTrial(visit)),
                ratio(HeterophoriaAca.at(visit)),
                models.of(visit),
                Numbers.orAbsent(belowEdge.right()),
                Numbers.orAbsent(belowEdge.left()),
                glassesChanged(visit));
    }

    private static boolean glassesChanged(Visit visit) {
        return visit.glasses().areWorn()
                && visit.lastBefore(earlier -> earlier.glasses().areWorn())
                        .map(earlier -> !Worn.isSame(earlier.glasses(), visit.glasses()))
                        .orElse(true);
    }

    /** All six conditions by name; what was not measured is null. */
    private static Map<String, @Nullable Double> turns(Map<TurnCondition, PrismDioptres> measured) {
        Map<String, @Nullable Double> turns = new LinkedHashMap<>();
        for (TurnCondition condition : TurnCondition.values()) {
            turns.put(name(condition), Numbers.orAbsent(measured.get(condition)));
        }
        return turns;
    }

    /** The condition's name in the data format: {@code ccDistance}. */
    static String name(TurnCondition condition) {
        String[] words = condition.name().split("_", -1);
        return words[0].toLowerCase(Locale.ROOT)
                + words[1].charAt(0)
                + words[1].substring(1).toLowerCase(Locale.ROOT);
    }

    private @Nullable RatioPart ratio(Optional<AcaEstimate> estimate) {
        return estimate.map(aca -> new RatioPart(
                        Numbers.plain(aca.ratio().value()),
                        Numbers.plain(aca.ratio().low()),
                        Numbers.plain(aca.ratio().high()),
                        sentences.of(aca.from())))
                .orElse(null);
    }
}
