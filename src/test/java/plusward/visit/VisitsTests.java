package plusward.visit;

import plusward.web.DatabaseSlice;

/** The contract of {@link VisitsContract} on H2. */
@DatabaseSlice
class VisitsTests extends VisitsContract {}
