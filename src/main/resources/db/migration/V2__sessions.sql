-- Signed-in sessions: the tables that Spring Session expects.
create table spring_session (
    primary_id            char(36) not null,
    session_id            char(36) not null,
    creation_time         bigint   not null,
    last_access_time      bigint   not null,
    max_inactive_interval integer  not null,
    expiry_time           bigint   not null,
    principal_name        varchar(100),
    constraint spring_session_key primary key (primary_id)
);

create unique index spring_session_by_id on spring_session (session_id);
create index spring_session_by_expiry on spring_session (expiry_time);
create index spring_session_by_principal on spring_session (principal_name);

create table spring_session_attributes (
    session_primary_id char(36)     not null,
    attribute_name     varchar(200) not null,
    attribute_bytes    ${blob}      not null,
    constraint spring_session_attributes_key primary key (session_primary_id, attribute_name),
    constraint spring_session_attributes_session foreign key (session_primary_id)
        references spring_session (primary_id) on delete cascade
);
