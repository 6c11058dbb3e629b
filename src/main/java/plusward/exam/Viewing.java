package plusward.exam;

/** How far away the child looked: at distance (6 m, optical infinity) or near (one third of a metre). */
public enum Viewing {
    DISTANCE,
    NEAR
}
