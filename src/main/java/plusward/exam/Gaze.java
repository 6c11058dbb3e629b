package plusward.exam;

/**
 * Where the child looks while the turn is measured, other than straight ahead.
 *
 * <p>Right and left are the child's own. How far up, down or aside differs between clinics and is not recorded; a clinic
 * compares its own readings with one another.
 */
public enum Gaze {
    /** Upward, the chin lowered. */
    UP,
    /** Downward, the chin raised. */
    DOWN,
    /** To the child's right. */
    RIGHT,
    /** To the child's left. */
    LEFT;

    /** As the mirror shows it: right and left change places, up and down stay. */
    public Gaze mirrored() {
        return switch (this) {
            case UP, DOWN -> this;
            case RIGHT -> LEFT;
            case LEFT -> RIGHT;
        };
    }
}
