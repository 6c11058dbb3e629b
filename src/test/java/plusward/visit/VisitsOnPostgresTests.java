package plusward.visit;

import plusward.web.PostgresSlice;

/** The contract of {@link VisitsContract} on PostgreSQL. */
@PostgresSlice
class VisitsOnPostgresTests extends VisitsContract {}
