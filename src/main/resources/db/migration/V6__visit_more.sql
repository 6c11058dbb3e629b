-- More of a visit, all optional: turns in directions of gaze, ductions, fixation, how cycloplegia was brought about, and the
-- segment by heights. The constraints mirror the value types.
alter table visit add column cycloplegic_drops integer;
alter table visit add column cycloplegic_minutes integer;
alter table visit add constraint visit_cycloplegic_drops check (cycloplegic_drops between 1 and 10);
alter table visit add constraint visit_cycloplegic_minutes check (cycloplegic_minutes between 1 and 1440);

alter table visit add column fixation varchar(13);
alter table visit add constraint visit_fixation check (fixation in ('ALTERNATES', 'PREFERS_RIGHT', 'PREFERS_LEFT'));

-- movements of each eye: true = limited; all of them were looked at, or none
alter table visit add column duction_right_abduction boolean;
alter table visit add column duction_right_adduction boolean;
alter table visit add column duction_right_elevation boolean;
alter table visit add column duction_right_depression boolean;
alter table visit add column duction_left_abduction boolean;
alter table visit add column duction_left_adduction boolean;
alter table visit add column duction_left_elevation boolean;
alter table visit add column duction_left_depression boolean;
alter table visit add constraint visit_ductions check (
        (duction_right_abduction is null and duction_right_adduction is null and duction_right_elevation is null and
            duction_right_depression is null and duction_left_abduction is null and duction_left_adduction is null and
            duction_left_elevation is null and duction_left_depression is null)
        or (duction_right_abduction is not null and duction_right_adduction is not null and
            duction_right_elevation is not null and duction_right_depression is not null and
            duction_left_abduction is not null and duction_left_adduction is not null and
            duction_left_elevation is not null and duction_left_depression is not null));

-- over the lowest point of the lens: top of the segment, pupil centre; their difference is the offset, within 0.05 mm of a
-- measured one
alter table visit add column segment_height_right_mm numeric(4,2);
alter table visit add column segment_pupil_height_right_mm numeric(4,2);
alter table visit add column segment_height_left_mm numeric(4,2);
alter table visit add column segment_pupil_height_left_mm numeric(4,2);
alter table visit add constraint visit_segment_height_right check (segment_height_right_mm between 0 and 60);
alter table visit add constraint visit_pupil_height_right check (segment_pupil_height_right_mm between 0 and 60);
alter table visit add constraint visit_segment_heights_right check (
        segment_height_right_mm - segment_pupil_height_right_mm between -20 and 20
        and (segment_right_mm is null or segment_height_right_mm is null or segment_pupil_height_right_mm is null
            or segment_right_mm - (segment_height_right_mm - segment_pupil_height_right_mm) between -0.05 and 0.05));
alter table visit add constraint visit_segment_height_left check (segment_height_left_mm between 0 and 60);
alter table visit add constraint visit_pupil_height_left check (segment_pupil_height_left_mm between 0 and 60);
alter table visit add constraint visit_segment_heights_left check (
        segment_height_left_mm - segment_pupil_height_left_mm between -20 and 20
        and (segment_left_mm is null or segment_height_left_mm is null or segment_pupil_height_left_mm is null
            or segment_left_mm - (segment_height_left_mm - segment_pupil_height_left_mm) between -0.05 and 0.05));

-- the turn with the glasses, at distance, in a direction of gaze; the columns of a turn as in the visit itself
create table visit_gaze (
    visit_id                bigint     not null,
    gaze                    varchar(5) not null,
    direction               varchar(7),
    phase                   varchar(12),
    prism_pd                numeric(4,1),
    other_prism_pd          numeric(4,1),
    vertical_higher         varchar(5),
    vertical_phase          varchar(12),
    vertical_prism_pd       numeric(4,1),
    vertical_other_prism_pd numeric(4,1),

    constraint visit_gaze_key primary key (visit_id, gaze),
    constraint visit_gaze_visit foreign key (visit_id) references visit (id) on delete cascade,
    constraint visit_gaze_known check (gaze in ('UP', 'DOWN', 'RIGHT', 'LEFT')),
    constraint visit_gaze_something check (direction is not null or vertical_higher is not null),
    constraint visit_gaze_horizontal check (
        (direction is null and phase is null and prism_pd is null and other_prism_pd is null)
        or (direction is not null and phase is not null and prism_pd is not null
            and direction in ('INWARD', 'OUTWARD') and phase in ('MANIFEST', 'INTERMITTENT', 'LATENT')
            and prism_pd between 0 and 150 and (other_prism_pd is null or other_prism_pd between 0 and 150)
            and (prism_pd <> 0 or coalesce(other_prism_pd, 0) <> 0 or (direction = 'INWARD' and phase = 'LATENT')))),
    constraint visit_gaze_vertical check (
        (vertical_higher is null and vertical_phase is null and vertical_prism_pd is null and vertical_other_prism_pd is null)
        or (vertical_higher is not null and vertical_phase is not null and vertical_prism_pd is not null
            and vertical_higher in ('RIGHT', 'LEFT') and vertical_phase in ('MANIFEST', 'INTERMITTENT', 'LATENT')
            and vertical_prism_pd between 0 and 150
            and (vertical_other_prism_pd is null or vertical_other_prism_pd between 0 and 150)))
);
