package plusward.exam;

/** The right eye (OD) or the left eye (OS). */
public enum Eye {
    RIGHT,
    LEFT;

    public Eye other() {
        return this == RIGHT ? LEFT : RIGHT;
    }
}
