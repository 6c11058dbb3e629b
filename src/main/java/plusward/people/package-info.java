/**
 * Accounts, sign-in, and who may open what. No public door: the framework carries who is signed in to everyone else.
 */
@NullMarked
package plusward.people;

import org.jspecify.annotations.NullMarked;
