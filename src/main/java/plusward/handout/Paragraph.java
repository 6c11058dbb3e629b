package plusward.handout;

import java.util.List;
import plusward.exam.Reason;

/** One small voice of the sheet: it says what holds for this child, and nothing when it has nothing true to say. */
interface Paragraph {

    /** Keys of messages with their values, in order; together they make one paragraph. Empty: the paragraph is left out. */
    List<Reason> say(SheetFacts facts);
}
