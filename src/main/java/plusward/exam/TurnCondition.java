package plusward.exam;

/** Under what the turn was measured: how far away, and through what. */
public enum TurnCondition {
    /** Without correction, at distance. */
    SC_DISTANCE(Viewing.DISTANCE),
    /** Without correction, at near. */
    SC_NEAR(Viewing.NEAR),
    /** With the glasses, at distance. */
    CC_DISTANCE(Viewing.DISTANCE),
    /** With the glasses, at near, through the distance part. */
    CC_NEAR(Viewing.NEAR),
    /** With the glasses, at near, through the segment. */
    ADD_NEAR(Viewing.NEAR),
    /** With the glasses and a trial plus held over them, at near. */
    TRIAL_NEAR(Viewing.NEAR);

    private final Viewing viewing;

    TurnCondition(Viewing viewing) {
        this.viewing = viewing;
    }

    /** How far away the child looked. */
    public Viewing viewing() {
        return viewing;
    }

    /** True when the child looked through glasses. */
    public boolean isCorrected() {
        return this != SC_DISTANCE && this != SC_NEAR;
    }
}
