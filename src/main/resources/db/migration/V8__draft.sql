-- A visit that is being typed and was not saved: for one account, one child, one visit or a new one, and the day it was begun for.
create table draft (
    account    varchar(100) not null,
    child_id   bigint       not null,
    visit_id   bigint       not null,
    begun_for  date         not null,
    version    integer      not null,
    why        varchar(200) not null,
    typed      text         not null,
    kept_at    timestamp with time zone not null,

    constraint draft_key primary key (account, child_id, visit_id, begun_for),
    constraint draft_of_child foreign key (child_id) references child (id)
);
