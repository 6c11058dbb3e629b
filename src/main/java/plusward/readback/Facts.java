package plusward.readback;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import plusward.course.CycloplegicInForce;
import plusward.course.GazePattern;
import plusward.course.Visit;
import plusward.course.Worn;
import plusward.exam.Eye;
import plusward.exam.PerEye;
import plusward.exam.Reason;
import plusward.optics.Dioptres;

/** What several fields say together. */
final class Facts {

    private Facts() {}

    static List<Reason> of(Visit visit) {
        List<Reason> facts = new ArrayList<>();
        if (visit.glasses().areWorn()) {
            facts.add(plus(visit));
        }
        GazePattern gazes = GazePattern.at(visit);
        if (gazes.upMinusDown() != null) {
            String letter = gazes.letter()
                    .map(each -> each.name().toLowerCase(Locale.ROOT))
                    .orElse("none");
            facts.add(Reason.of("readback.gaze.up-down." + letter, gazes.upMinusDown()));
        }
        if (gazes.rightMinusLeft() != null) {
            facts.add(Reason.of("readback.gaze.right-left", gazes.rightMinusLeft()));
        }
        return facts;
    }

    /** How far the worn plus is from the cycloplegic refraction in force, or that it cannot be told. */
    private static Reason plus(Visit visit) {
        PerEye<Dioptres> shortBy = Worn.shortBy(visit);
        return CycloplegicInForce.at(visit)
                .map(found -> Reason.of(
                        "readback.plus",
                        eye(Eye.RIGHT, shortBy.right()),
                        eye(Eye.LEFT, shortBy.left()),
                        found.takenOn()))
                .orElseGet(() -> Reason.of("readback.plus.unknown"));
    }

    private static Reason eye(Eye eye, @Nullable Dioptres shortBy) {
        String key = "readback.plus." + eye.name().toLowerCase(Locale.ROOT);
        if (shortBy == null) {
            return Reason.of(key + ".unknown");
        }
        String how = shortBy.amount() == 0 ? ".even" : shortBy.amount() > 0 ? ".short" : ".over";
        return Reason.of(key + how, shortBy.size());
    }
}
