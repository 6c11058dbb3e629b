/**
 * One child's visits in order, and what follows from them: derived values, whether the turn is held, AC/A, the model of
 * focusing, the pattern, the trend.
 *
 * <p>What is said of a visit uses that visit and earlier ones, never a later one: a {@link plusward.course.Visit} can only
 * look back. Every answer carries its reason as a message key with typed values. What cannot be told from the record is an
 * answer of its own and never "normal".
 */
@NullMarked
package plusward.course;

import org.jspecify.annotations.NullMarked;
