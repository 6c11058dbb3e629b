-- The two CSV files that an account has chosen and not yet brought in
create table import_upload (
    account varchar(100) not null primary key,
    uploaded_at timestamp with time zone not null,
    children ${blob},
    visits ${blob}
);
