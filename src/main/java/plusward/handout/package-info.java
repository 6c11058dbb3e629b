/**
 * The sheet that parents take home: plain words, this child's own numbers, two drawings made for this child.
 *
 * <p>A sheet is a list of {@link plusward.handout.Section}s, a section a list of {@link plusward.handout.Paragraph}s. A
 * paragraph looks at the facts and answers with message keys and values; the prose is in {@code messages/handout.properties}.
 */
@NullMarked
package plusward.handout;

import org.jspecify.annotations.NullMarked;
