package plusward.exam;

/** The right eye (OD) or the left eye (OS). */
public enum Eye {
    /** OD, the eye on the wearer's right. */
    RIGHT,
    /** OS, the eye on the wearer's left. */
    LEFT;

    /** The fellow eye. */
    public Eye other() {
        return this == RIGHT ? LEFT : RIGHT;
    }
}
