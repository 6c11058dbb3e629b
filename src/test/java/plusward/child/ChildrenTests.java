package plusward.child;

import plusward.web.DatabaseSlice;

/** The contract of {@link ChildrenContract} on H2. */
@DatabaseSlice
class ChildrenTests extends ChildrenContract {}
