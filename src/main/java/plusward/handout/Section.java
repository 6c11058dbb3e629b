package plusward.handout;

import java.util.List;
import plusward.exam.Reason;

/**
 * A part of the sheet.
 *
 * @param code as templates and messages write it
 * @param paragraphs its voices, in the order in which they speak
 */
record Section(String code, List<Paragraph> paragraphs) {

    /** The parts in the order in which parents ask. */
    static final List<Section> ALL = List.of(
            new Section("found", List.of(new WhetherHeld(), new TurnInNumbers())),
            new Section("why", List.of(new ReadsTheChart(), new FocusesHard(), new FocusingTurnsIn())),
            new Section("do", List.of(new GlassesFocus(), new WithoutThem())),
            new Section("wear", List.of(new AllDay(), new NewGlasses())),
            new Section("line", List.of(new LineSitsHigh(), new LineNow())),
            new Section("watch", List.of(new WatchTheEyes())),
            new Section("next", List.of(new NextVisit())));

    Reason heading(SheetFacts facts) {
        return facts.sentence("section." + code);
    }
}
