-- A child as the clinic knows it.
create sequence child_id increment by 50;

create table child (
    id                     bigint      not null,
    version                integer     not null,
    created_by             varchar(60),
    created_at             timestamp with time zone not null,
    changed_by             varchar(60),
    changed_at             timestamp with time zone not null,

    clinic_number          varchar(20) not null,
    given_name             varchar(80),
    family_name            varchar(80),
    born_on                date        not null,
    turn_first_seen_months integer,
    handout_language       varchar(2)  not null,
    note                   varchar(4000),

    constraint child_key primary key (id),
    constraint child_clinic_number_unique unique (clinic_number),
    constraint child_clinic_number_plain check (clinic_number <> '' and clinic_number = trim(clinic_number)),
    constraint child_born_on_plausible check (born_on between date '1900-01-01' and date '2199-12-31'),
    constraint child_turn_first_seen_plausible check (turn_first_seen_months between 0 and 216),
    constraint child_handout_language_known check (handout_language in ('en', 'es'))
);

create index child_by_name on child (family_name, given_name);
