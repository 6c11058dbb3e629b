-- What was seen and measured at one visit: one wide row. Empty = not measured, never zero. Columns carry their unit
-- (d = dioptres, pd = prism dioptres); the constraints mirror the value types, so that no other writer can store nonsense.
create sequence visit_id increment by 50;

create table visit (
    id         bigint      not null,
    child_id   bigint      not null,
    version    integer     not null,
    created_by varchar(60),
    created_at timestamp with time zone not null,
    changed_by varchar(60),
    changed_at timestamp with time zone not null,

    visit_date date not null,
    examiner   varchar(80),

    -- the glasses worn, as ordered
    wear_hours            numeric(4,2),
    worn_right_sphere_d   numeric(5,2),
    worn_right_cylinder_d numeric(5,2),
    worn_right_axis_deg   integer,
    worn_left_sphere_d    numeric(5,2),
    worn_left_cylinder_d  numeric(5,2),
    worn_left_axis_deg    integer,
    worn_add_d            numeric(3,2),
    worn_since            date,

    -- the lensmeter reading of those glasses
    made_right_sphere_d   numeric(5,2),
    made_right_cylinder_d numeric(5,2),
    made_right_axis_deg   integer,
    made_left_sphere_d    numeric(5,2),
    made_left_cylinder_d  numeric(5,2),
    made_left_axis_deg    integer,
    made_add_d            numeric(3,2),

    -- distance acuity with correction
    acuity_right_kind        varchar(17),
    acuity_right_written     varchar(60),
    acuity_right_size_logmar numeric(10,9),
    acuity_left_kind         varchar(17),
    acuity_left_written      varchar(60),
    acuity_left_size_logmar  numeric(10,9),
    acuity_both_kind         varchar(17),
    acuity_both_written      varchar(60),
    acuity_both_size_logmar  numeric(10,9),

    -- distance acuity without
    acuity_sc_right_kind        varchar(17),
    acuity_sc_right_written     varchar(60),
    acuity_sc_right_size_logmar numeric(10,9),
    acuity_sc_left_kind         varchar(17),
    acuity_sc_left_written      varchar(60),
    acuity_sc_left_size_logmar  numeric(10,9),
    acuity_sc_both_kind         varchar(17),
    acuity_sc_both_written      varchar(60),
    acuity_sc_both_size_logmar  numeric(10,9),

    -- stereoacuity at near; nil = looked for and none found
    stereo_nil    boolean,
    stereo_arcsec integer,

    -- turn without correction, distance
    turn_sc_distance_direction               varchar(7),
    turn_sc_distance_phase                   varchar(12),
    turn_sc_distance_prism_pd                numeric(4,1),
    turn_sc_distance_other_prism_pd          numeric(4,1),
    turn_sc_distance_vertical_higher         varchar(5),
    turn_sc_distance_vertical_phase          varchar(12),
    turn_sc_distance_vertical_prism_pd       numeric(4,1),
    turn_sc_distance_vertical_other_prism_pd numeric(4,1),

    -- turn without correction, near
    turn_sc_near_direction               varchar(7),
    turn_sc_near_phase                   varchar(12),
    turn_sc_near_prism_pd                numeric(4,1),
    turn_sc_near_other_prism_pd          numeric(4,1),
    turn_sc_near_vertical_higher         varchar(5),
    turn_sc_near_vertical_phase          varchar(12),
    turn_sc_near_vertical_prism_pd       numeric(4,1),
    turn_sc_near_vertical_other_prism_pd numeric(4,1),

    -- turn with the glasses, distance
    turn_cc_distance_direction               varchar(7),
    turn_cc_distance_phase                   varchar(12),
    turn_cc_distance_prism_pd                numeric(4,1),
    turn_cc_distance_other_prism_pd          numeric(4,1),
    turn_cc_distance_vertical_higher         varchar(5),
    turn_cc_distance_vertical_phase          varchar(12),
    turn_cc_distance_vertical_prism_pd       numeric(4,1),
    turn_cc_distance_vertical_other_prism_pd numeric(4,1),

    -- turn with the glasses, near, through the distance part
    turn_cc_near_direction               varchar(7),
    turn_cc_near_phase                   varchar(12),
    turn_cc_near_prism_pd                numeric(4,1),
    turn_cc_near_other_prism_pd          numeric(4,1),
    turn_cc_near_vertical_higher         varchar(5),
    turn_cc_near_vertical_phase          varchar(12),
    turn_cc_near_vertical_prism_pd       numeric(4,1),
    turn_cc_near_vertical_other_prism_pd numeric(4,1),

    -- turn with the glasses, near, through the segment
    turn_add_near_direction               varchar(7),
    turn_add_near_phase                   varchar(12),
    turn_add_near_prism_pd                numeric(4,1),
    turn_add_near_other_prism_pd          numeric(4,1),
    turn_add_near_vertical_higher         varchar(5),
    turn_add_near_vertical_phase          varchar(12),
    turn_add_near_vertical_prism_pd       numeric(4,1),
    turn_add_near_vertical_other_prism_pd numeric(4,1),

    -- turn with the glasses and a trial plus, near
    trial_plus_d                            numeric(3,2),
    turn_trial_near_direction               varchar(7),
    turn_trial_near_phase                   varchar(12),
    turn_trial_near_prism_pd                numeric(4,1),
    turn_trial_near_other_prism_pd          numeric(4,1),
    turn_trial_near_vertical_higher         varchar(5),
    turn_trial_near_vertical_phase          varchar(12),
    turn_trial_near_vertical_prism_pd       numeric(4,1),
    turn_trial_near_vertical_other_prism_pd numeric(4,1),

    -- refraction under cycloplegia
    cycloplegic_right_sphere_d   numeric(5,2),
    cycloplegic_right_cylinder_d numeric(5,2),
    cycloplegic_right_axis_deg   integer,
    cycloplegic_left_sphere_d    numeric(5,2),
    cycloplegic_left_cylinder_d  numeric(5,2),
    cycloplegic_left_axis_deg    integer,
    cycloplegic_agent            varchar(14),

    -- refraction without
    manifest_right_sphere_d   numeric(5,2),
    manifest_right_cylinder_d numeric(5,2),
    manifest_right_axis_deg   integer,
    manifest_left_sphere_d    numeric(5,2),
    manifest_left_cylinder_d  numeric(5,2),
    manifest_left_axis_deg    integer,

    -- top of the segment from the pupil centre: + above, - below; pupil; distance between the pupils
    segment_style    varchar(11),
    segment_right_mm numeric(4,2),
    segment_left_mm  numeric(4,2),
    segment_pupil_mm numeric(4,2),
    pd_mm            numeric(4,2),

    -- ordered at this visit
    ordered_right_sphere_d   numeric(5,2),
    ordered_right_cylinder_d numeric(5,2),
    ordered_right_axis_deg   integer,
    ordered_left_sphere_d    numeric(5,2),
    ordered_left_cylinder_d  numeric(5,2),
    ordered_left_axis_deg    integer,
    ordered_add_d            numeric(3,2),

    -- next visit and note
    next_visit_weeks integer,
    note             varchar(4000),

    constraint visit_key primary key (id),
    constraint visit_child foreign key (child_id) references child (id),
    constraint visit_once_a_day unique (child_id, visit_date),
    constraint visit_date_plausible check (visit_date between date '1900-01-01' and date '2199-12-31')
);
