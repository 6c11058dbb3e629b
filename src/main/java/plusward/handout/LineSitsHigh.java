package plusward.handout;

import java.util.List;
import plusward.exam.Reason;

/** What the lower part of the lenses is for, and why a child's line sits higher than a grown-up's. */
final class LineSitsHigh implements Paragraph {

    @Override
    public List<Reason> say(SheetFacts facts) {
        if (!facts.lenses().haveAdd()) {
            return List.of();
        }
        boolean line = facts.visit().exam().segment().hasLine();
        return List.of(
                facts.sentence("line.what"),
                facts.sentence("line.glance"),
                facts.sentence(line ? "line.high" : "line.none"));
    }
}
