package plusward.exam;

/** A field whose text could not be read, and why. */
public record Refusal(Field field, NotationException problem) {}
