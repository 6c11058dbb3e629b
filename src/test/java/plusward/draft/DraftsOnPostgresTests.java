package plusward.draft;

import plusward.web.PostgresSlice;

/** The contract of {@link DraftsContract} on PostgreSQL. */
@PostgresSlice
class DraftsOnPostgresTests extends DraftsContract {}
