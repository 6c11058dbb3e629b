package plusward.exam;

/**
 * A field whose text could not be read, and why.
 *
 * @param field the field
 * @param problem what was read, what is wrong with it and what would be accepted
 */
public record Refusal(Field field, NotationException problem) {}
