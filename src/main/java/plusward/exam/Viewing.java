package plusward.exam;

/** How far away the child looked: at distance (6 m, optical infinity) or near (one third of a metre). */
public enum Viewing {
    /** 6 m or 20 feet, which counts as infinitely far. */
    DISTANCE,
    /** One third of a metre, a demand of 3 D. */
    NEAR
}
