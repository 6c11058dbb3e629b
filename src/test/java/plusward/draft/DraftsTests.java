package plusward.draft;

import plusward.web.DatabaseSlice;

/** The contract of {@link DraftsContract} on H2. */
@DatabaseSlice
class DraftsTests extends DraftsContract {}
