-- What was changed in a visit after it was stored, and what was confirmed while it was typed: who, when, old and new, and why.
create sequence visit_change_id increment by 50;

create table visit_change (
    id          bigint      not null,
    visit_id    bigint      not null,
    kind        varchar(9)  not null,
    field       varchar(40) not null,
    before_text varchar(4000),
    after_text  varchar(4000),
    why         varchar(200),
    created_by  varchar(60),
    created_at  timestamp with time zone not null,

    constraint visit_change_key primary key (id),
    constraint visit_change_of_visit foreign key (visit_id) references visit (id),
    constraint visit_change_kind_known check (kind in ('CORRECTED', 'IMPORTED', 'CONFIRMED')),
    constraint visit_change_corrected_why check (kind <> 'CORRECTED' or (why is not null and why <> ''))
);

create index visit_change_of on visit_change (visit_id);
