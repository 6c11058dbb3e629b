package plusward.child;

import plusward.web.PostgresSlice;

/** The contract of {@link ChildrenContract} on PostgreSQL. */
@PostgresSlice
class ChildrenOnPostgresTests extends ChildrenContract {}
