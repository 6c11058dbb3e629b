package plusward.course;

import java.util.Locale;

/** Whether the turn is held with the glasses, in the words of the data format. */
public enum ControlState {
    HELD,
    HELD_THROUGH_ADD,
    NOT_HELD_DISTANCE,
    NOT_HELD_NEAR,
    NOT_HELD_BOTH,
    TURNED_OUT,
    NOT_ASSESSABLE;

    /** The state as data and messages write it: {@code held-through-add}. */
    public String code() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    public boolean isHeld() {
        return this == HELD || this == HELD_THROUGH_ADD;
    }

    public boolean isNotHeld() {
        return this == NOT_HELD_DISTANCE || this == NOT_HELD_NEAR || this == NOT_HELD_BOTH;
    }

    public boolean isAssessable() {
        return this != NOT_ASSESSABLE;
    }
}
