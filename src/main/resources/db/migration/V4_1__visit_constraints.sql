-- What each group of columns of a visit may hold: all of it or none of it, within the range of its value type.
alter table visit add constraint visit_wear check (wear_hours between 0 and 24);
alter table visit add constraint visit_worn_right check (
        (worn_right_sphere_d is null and worn_right_cylinder_d is null and worn_right_axis_deg is null)
        or (worn_right_sphere_d is not null and worn_right_cylinder_d is not null and worn_right_axis_deg is not null
            and worn_right_sphere_d between -30 and 30 and worn_right_cylinder_d between -15 and 15 and worn_right_axis_deg between 1 and 180
            and (worn_right_cylinder_d <> 0 or worn_right_axis_deg = 180)));
alter table visit add constraint visit_worn_left check (
        (worn_left_sphere_d is null and worn_left_cylinder_d is null and worn_left_axis_deg is null)
        or (worn_left_sphere_d is not null and worn_left_cylinder_d is not null and worn_left_axis_deg is not null
            and worn_left_sphere_d between -30 and 30 and worn_left_cylinder_d between -15 and 15 and worn_left_axis_deg between 1 and 180
            and (worn_left_cylinder_d <> 0 or worn_left_axis_deg = 180)));
alter table visit add constraint visit_worn_add check (worn_add_d between 0 and 4);
alter table visit add constraint visit_worn_since check (worn_since between date '1900-01-01' and date '2199-12-31');
alter table visit add constraint visit_made_right check (
        (made_right_sphere_d is null and made_right_cylinder_d is null and made_right_axis_deg is null)
        or (made_right_sphere_d is not null and made_right_cylinder_d is not null and made_right_axis_deg is not null
            and made_right_sphere_d between -30 and 30 and made_right_cylinder_d between -15 and 15 and made_right_axis_deg between 1 and 180
            and (made_right_cylinder_d <> 0 or made_right_axis_deg = 180)));
alter table visit add constraint visit_made_left check (
        (made_left_sphere_d is null and made_left_cylinder_d is null and made_left_axis_deg is null)
        or (made_left_sphere_d is not null and made_left_cylinder_d is not null and made_left_axis_deg is not null
            and made_left_sphere_d between -30 and 30 and made_left_cylinder_d between -15 and 15 and made_left_axis_deg between 1 and 180
            and (made_left_cylinder_d <> 0 or made_left_axis_deg = 180)));
alter table visit add constraint visit_made_add check (made_add_d between 0 and 4);
alter table visit add constraint visit_acuity_right check (
        (acuity_right_kind is null and acuity_right_written is null and acuity_right_size_logmar is null)
        or (acuity_right_kind is not null and acuity_right_written is not null
            and acuity_right_kind in ('CHART', 'CF', 'HM', 'LP', 'NLP', 'FIXES_AND_FOLLOWS')
            and (acuity_right_kind = 'CHART') = (acuity_right_size_logmar is not null)
            and (acuity_right_size_logmar is null or acuity_right_size_logmar between -0.5 and 2)));
alter table visit add constraint visit_acuity_left check (
        (acuity_left_kind is null and acuity_left_written is null and acuity_left_size_logmar is null)
        or (acuity_left_kind is not null and acuity_left_written is not null
            and acuity_left_kind in ('CHART', 'CF', 'HM', 'LP', 'NLP', 'FIXES_AND_FOLLOWS')
            and (acuity_left_kind = 'CHART') = (acuity_left_size_logmar is not null)
            and (acuity_left_size_logmar is null or acuity_left_size_logmar between -0.5 and 2)));
alter table visit add constraint visit_acuity_both check (
        (acuity_both_kind is null and acuity_both_written is null and acuity_both_size_logmar is null)
        or (acuity_both_kind is not null and acuity_both_written is not null
            and acuity_both_kind in ('CHART', 'CF', 'HM', 'LP', 'NLP', 'FIXES_AND_FOLLOWS')
            and (acuity_both_kind = 'CHART') = (acuity_both_size_logmar is not null)
            and (acuity_both_size_logmar is null or acuity_both_size_logmar between -0.5 and 2)));
alter table visit add constraint visit_acuity_sc_right check (
        (acuity_sc_right_kind is null and acuity_sc_right_written is null and acuity_sc_right_size_logmar is null)
        or (acuity_sc_right_kind is not null and acuity_sc_right_written is not null
            and acuity_sc_right_kind in ('CHART', 'CF', 'HM', 'LP', 'NLP', 'FIXES_AND_FOLLOWS')
            and (acuity_sc_right_kind = 'CHART') = (acuity_sc_right_size_logmar is not null)
            and (acuity_sc_right_size_logmar is null or acuity_sc_right_size_logmar between -0.5 and 2)));
alter table visit add constraint visit_acuity_sc_left check (
        (acuity_sc_left_kind is null and acuity_sc_left_written is null and acuity_sc_left_size_logmar is null)
        or (acuity_sc_left_kind is not null and acuity_sc_left_written is not null
            and acuity_sc_left_kind in ('CHART', 'CF', 'HM', 'LP', 'NLP', 'FIXES_AND_FOLLOWS')
            and (acuity_sc_left_kind = 'CHART') = (acuity_sc_left_size_logmar is not null)
            and (acuity_sc_left_size_logmar is null or acuity_sc_left_size_logmar between -0.5 and 2)));
alter table visit add constraint visit_acuity_sc_both check (
        (acuity_sc_both_kind is null and acuity_sc_both_written is null and acuity_sc_both_size_logmar is null)
        or (acuity_sc_both_kind is not null and acuity_sc_both_written is not null
            and acuity_sc_both_kind in ('CHART', 'CF', 'HM', 'LP', 'NLP', 'FIXES_AND_FOLLOWS')
            and (acuity_sc_both_kind = 'CHART') = (acuity_sc_both_size_logmar is not null)
            and (acuity_sc_both_size_logmar is null or acuity_sc_both_size_logmar between -0.5 and 2)));
alter table visit add constraint visit_stereo check (
        (stereo_nil is null and stereo_arcsec is null)
        or (stereo_nil is not null and stereo_nil = (stereo_arcsec is null)
            and (stereo_arcsec is null or stereo_arcsec between 1 and 10000)));
alter table visit add constraint visit_turn_sc_distance check (
        (turn_sc_distance_direction is null and turn_sc_distance_phase is null and turn_sc_distance_prism_pd is null and turn_sc_distance_other_prism_pd is null)
        or (turn_sc_distance_direction is not null and turn_sc_distance_phase is not null and turn_sc_distance_prism_pd is not null
            and turn_sc_distance_direction in ('INWARD', 'OUTWARD') and turn_sc_distance_phase in ('MANIFEST', 'INTERMITTENT', 'LATENT')
            and turn_sc_distance_prism_pd between 0 and 150 and (turn_sc_distance_other_prism_pd is null or turn_sc_distance_other_prism_pd between 0 and 150)
            and (turn_sc_distance_prism_pd <> 0 or coalesce(turn_sc_distance_other_prism_pd, 0) <> 0 or (turn_sc_distance_direction = 'INWARD' and turn_sc_distance_phase = 'LATENT'))));
alter table visit add constraint visit_turn_sc_distance_vertical check (
        (turn_sc_distance_vertical_higher is null and turn_sc_distance_vertical_phase is null and turn_sc_distance_vertical_prism_pd is null
            and turn_sc_distance_vertical_other_prism_pd is null)
        or (turn_sc_distance_vertical_higher is not null and turn_sc_distance_vertical_phase is not null and turn_sc_distance_vertical_prism_pd is not null
            and turn_sc_distance_vertical_higher in ('RIGHT', 'LEFT') and turn_sc_distance_vertical_phase in ('MANIFEST', 'INTERMITTENT', 'LATENT')
            and turn_sc_distance_vertical_prism_pd between 0 and 150
            and (turn_sc_distance_vertical_other_prism_pd is null or turn_sc_distance_vertical_other_prism_pd between 0 and 150)));
alter table visit add constraint visit_turn_sc_near check (
        (turn_sc_near_direction is null and turn_sc_near_phase is null and turn_sc_near_prism_pd is null and turn_sc_near_other_prism_pd is null)
        or (turn_sc_near_direction is not null and turn_sc_near_phase is not null and turn_sc_near_prism_pd is not null
            and turn_sc_near_direction in ('INWARD', 'OUTWARD') and turn_sc_near_phase in ('MANIFEST', 'INTERMITTENT', 'LATENT')
            and turn_sc_near_prism_pd between 0 and 150 and (turn_sc_near_other_prism_pd is null or turn_sc_near_other_prism_pd between 0 and 150)
            and (turn_sc_near_prism_pd <> 0 or coalesce(turn_sc_near_other_prism_pd, 0) <> 0 or (turn_sc_near_direction = 'INWARD' and turn_sc_near_phase = 'LATENT'))));
alter table visit add constraint visit_turn_sc_near_vertical check (
        (turn_sc_near_vertical_higher is null and turn_sc_near_vertical_phase is null and turn_sc_near_vertical_prism_pd is null
            and turn_sc_near_vertical_other_prism_pd is null)
        or (turn_sc_near_vertical_higher is not null and turn_sc_near_vertical_phase is not null and turn_sc_near_vertical_prism_pd is not null
            and turn_sc_near_vertical_higher in ('RIGHT', 'LEFT') and turn_sc_near_vertical_phase in ('MANIFEST', 'INTERMITTENT', 'LATENT')
            and turn_sc_near_vertical_prism_pd between 0 and 150
            and (turn_sc_near_vertical_other_prism_pd is null or turn_sc_near_vertical_other_prism_pd between 0 and 150)));
alter table visit add constraint visit_turn_cc_distance check (
        (turn_cc_distance_direction is null and turn_cc_distance_phase is null and turn_cc_distance_prism_pd is null and turn_cc_distance_other_prism_pd is null)
        or (turn_cc_distance_direction is not null and turn_cc_distance_phase is not null and turn_cc_distance_prism_pd is not null
            and turn_cc_distance_direction in ('INWARD', 'OUTWARD') and turn_cc_distance_phase in ('MANIFEST', 'INTERMITTENT', 'LATENT')
            and turn_cc_distance_prism_pd between 0 and 150 and (turn_cc_distance_other_prism_pd is null or turn_cc_distance_other_prism_pd between 0 and 150)
            and (turn_cc_distance_prism_pd <> 0 or coalesce(turn_cc_distance_other_prism_pd, 0) <> 0 or (turn_cc_distance_direction = 'INWARD' and turn_cc_distance_phase = 'LATENT'))));
alter table visit add constraint visit_turn_cc_distance_vertical check (
        (turn_cc_distance_vertical_higher is null and turn_cc_distance_vertical_phase is null and turn_cc_distance_vertical_prism_pd is null
            and turn_cc_distance_vertical_other_prism_pd is null)
        or (turn_cc_distance_vertical_higher is not null and turn_cc_distance_vertical_phase is not null and turn_cc_distance_vertical_prism_pd is not null
            and turn_cc_distance_vertical_higher in ('RIGHT', 'LEFT') and turn_cc_distance_vertical_phase in ('MANIFEST', 'INTERMITTENT', 'LATENT')
            and turn_cc_distance_vertical_prism_pd between 0 and 150
            and (turn_cc_distance_vertical_other_prism_pd is null or turn_cc_distance_vertical_other_prism_pd between 0 and 150)));
alter table visit add constraint visit_turn_cc_near check (
        (turn_cc_near_direction is null and turn_cc_near_phase is null and turn_cc_near_prism_pd is null and turn_cc_near_other_prism_pd is null)
        or (turn_cc_near_direction is not null and turn_cc_near_phase is not null and turn_cc_near_prism_pd is not null
            and turn_cc_near_direction in ('INWARD', 'OUTWARD') and turn_cc_near_phase in ('MANIFEST', 'INTERMITTENT', 'LATENT')
            and turn_cc_near_prism_pd between 0 and 150 and (turn_cc_near_other_prism_pd is null or turn_cc_near_other_prism_pd between 0 and 150)
            and (turn_cc_near_prism_pd <> 0 or coalesce(turn_cc_near_other_prism_pd, 0) <> 0 or (turn_cc_near_direction = 'INWARD' and turn_cc_near_phase = 'LATENT'))));
alter table visit add constraint visit_turn_cc_near_vertical check (
        (turn_cc_near_vertical_higher is null and turn_cc_near_vertical_phase is null and turn_cc_near_vertical_prism_pd is null
            and turn_cc_near_vertical_other_prism_pd is null)
        or (turn_cc_near_vertical_higher is not null and turn_cc_near_vertical_phase is not null and turn_cc_near_vertical_prism_pd is not null
            and turn_cc_near_vertical_higher in ('RIGHT', 'LEFT') and turn_cc_near_vertical_phase in ('MANIFEST', 'INTERMITTENT', 'LATENT')
            and turn_cc_near_vertical_prism_pd between 0 and 150
            and (turn_cc_near_vertical_other_prism_pd is null or turn_cc_near_vertical_other_prism_pd between 0 and 150)));
alter table visit add constraint visit_turn_add_near check (
        (turn_add_near_direction is null and turn_add_near_phase is null and turn_add_near_prism_pd is null and turn_add_near_other_prism_pd is null)
        or (turn_add_near_direction is not null and turn_add_near_phase is not null and turn_add_near_prism_pd is not null
            and turn_add_near_direction in ('INWARD', 'OUTWARD') and turn_add_near_phase in ('MANIFEST', 'INTERMITTENT', 'LATENT')
            and turn_add_near_prism_pd between 0 and 150 and (turn_add_near_other_prism_pd is null or turn_add_near_other_prism_pd between 0 and 150)
            and (turn_add_near_prism_pd <> 0 or coalesce(turn_add_near_other_prism_pd, 0) <> 0 or (turn_add_near_direction = 'INWARD' and turn_add_near_phase = 'LATENT'))));
alter table visit add constraint visit_turn_add_near_vertical check (
        (turn_add_near_vertical_higher is null and turn_add_near_vertical_phase is null and turn_add_near_vertical_prism_pd is null
            and turn_add_near_vertical_other_prism_pd is null)
        or (turn_add_near_vertical_higher is not null and turn_add_near_vertical_phase is not null and turn_add_near_vertical_prism_pd is not null
            and turn_add_near_vertical_higher in ('RIGHT', 'LEFT') and turn_add_near_vertical_phase in ('MANIFEST', 'INTERMITTENT', 'LATENT')
            and turn_add_near_vertical_prism_pd between 0 and 150
            and (turn_add_near_vertical_other_prism_pd is null or turn_add_near_vertical_other_prism_pd between 0 and 150)));
alter table visit add constraint visit_trial_plus check (trial_plus_d between 0 and 4);
alter table visit add constraint visit_turn_trial_near check (
        (turn_trial_near_direction is null and turn_trial_near_phase is null and turn_trial_near_prism_pd is null and turn_trial_near_other_prism_pd is null)
        or (turn_trial_near_direction is not null and turn_trial_near_phase is not null and turn_trial_near_prism_pd is not null
            and turn_trial_near_direction in ('INWARD', 'OUTWARD') and turn_trial_near_phase in ('MANIFEST', 'INTERMITTENT', 'LATENT')
            and turn_trial_near_prism_pd between 0 and 150 and (turn_trial_near_other_prism_pd is null or turn_trial_near_other_prism_pd between 0 and 150)
            and (turn_trial_near_prism_pd <> 0 or coalesce(turn_trial_near_other_prism_pd, 0) <> 0 or (turn_trial_near_direction = 'INWARD' and turn_trial_near_phase = 'LATENT'))));
alter table visit add constraint visit_turn_trial_near_vertical check (
        (turn_trial_near_vertical_higher is null and turn_trial_near_vertical_phase is null and turn_trial_near_vertical_prism_pd is null
            and turn_trial_near_vertical_other_prism_pd is null)
        or (turn_trial_near_vertical_higher is not null and turn_trial_near_vertical_phase is not null and turn_trial_near_vertical_prism_pd is not null
            and turn_trial_near_vertical_higher in ('RIGHT', 'LEFT') and turn_trial_near_vertical_phase in ('MANIFEST', 'INTERMITTENT', 'LATENT')
            and turn_trial_near_vertical_prism_pd between 0 and 150
            and (turn_trial_near_vertical_other_prism_pd is null or turn_trial_near_vertical_other_prism_pd between 0 and 150)));
alter table visit add constraint visit_cycloplegic_right check (
        (cycloplegic_right_sphere_d is null and cycloplegic_right_cylinder_d is null and cycloplegic_right_axis_deg is null)
        or (cycloplegic_right_sphere_d is not null and cycloplegic_right_cylinder_d is not null and cycloplegic_right_axis_deg is not null
            and cycloplegic_right_sphere_d between -30 and 30 and cycloplegic_right_cylinder_d between -15 and 15 and cycloplegic_right_axis_deg between 1 and 180
            and (cycloplegic_right_cylinder_d <> 0 or cycloplegic_right_axis_deg = 180)));
alter table visit add constraint visit_cycloplegic_left check (
        (cycloplegic_left_sphere_d is null and cycloplegic_left_cylinder_d is null and cycloplegic_left_axis_deg is null)
        or (cycloplegic_left_sphere_d is not null and cycloplegic_left_cylinder_d is not null and cycloplegic_left_axis_deg is not null
            and cycloplegic_left_sphere_d between -30 and 30 and cycloplegic_left_cylinder_d between -15 and 15 and cycloplegic_left_axis_deg between 1 and 180
            and (cycloplegic_left_cylinder_d <> 0 or cycloplegic_left_axis_deg = 180)));
alter table visit add constraint visit_cycloplegic_agent check (cycloplegic_agent in ('CYCLOPENTOLATE', 'ATROPINE', 'TROPICAMIDE', 'OTHER'));
alter table visit add constraint visit_manifest_right check (
        (manifest_right_sphere_d is null and manifest_right_cylinder_d is null and manifest_right_axis_deg is null)
        or (manifest_right_sphere_d is not null and manifest_right_cylinder_d is not null and manifest_right_axis_deg is not null
            and manifest_right_sphere_d between -30 and 30 and manifest_right_cylinder_d between -15 and 15 and manifest_right_axis_deg between 1 and 180
            and (manifest_right_cylinder_d <> 0 or manifest_right_axis_deg = 180)));
alter table visit add constraint visit_manifest_left check (
        (manifest_left_sphere_d is null and manifest_left_cylinder_d is null and manifest_left_axis_deg is null)
        or (manifest_left_sphere_d is not null and manifest_left_cylinder_d is not null and manifest_left_axis_deg is not null
            and manifest_left_sphere_d between -30 and 30 and manifest_left_cylinder_d between -15 and 15 and manifest_left_axis_deg between 1 and 180
            and (manifest_left_cylinder_d <> 0 or manifest_left_axis_deg = 180)));
alter table visit add constraint visit_segment_style check (segment_style in ('FLAT_TOP_28', 'FLAT_TOP_35', 'EXECUTIVE', 'ROUND', 'PROGRESSIVE', 'OTHER'));
alter table visit add constraint visit_segment_right check (segment_right_mm between -20 and 20);
alter table visit add constraint visit_segment_left check (segment_left_mm between -20 and 20);
alter table visit add constraint visit_pupil check (segment_pupil_mm between 1 and 10);
alter table visit add constraint visit_pd check (pd_mm between 30 and 80);
alter table visit add constraint visit_ordered_right check (
        (ordered_right_sphere_d is null and ordered_right_cylinder_d is null and ordered_right_axis_deg is null)
        or (ordered_right_sphere_d is not null and ordered_right_cylinder_d is not null and ordered_right_axis_deg is not null
            and ordered_right_sphere_d between -30 and 30 and ordered_right_cylinder_d between -15 and 15 and ordered_right_axis_deg between 1 and 180
            and (ordered_right_cylinder_d <> 0 or ordered_right_axis_deg = 180)));
alter table visit add constraint visit_ordered_left check (
        (ordered_left_sphere_d is null and ordered_left_cylinder_d is null and ordered_left_axis_deg is null)
        or (ordered_left_sphere_d is not null and ordered_left_cylinder_d is not null and ordered_left_axis_deg is not null
            and ordered_left_sphere_d between -30 and 30 and ordered_left_cylinder_d between -15 and 15 and ordered_left_axis_deg between 1 and 180
            and (ordered_left_cylinder_d <> 0 or ordered_left_axis_deg = 180)));
alter table visit add constraint visit_ordered_add check (ordered_add_d between 0 and 4);
alter table visit add constraint visit_next_visit check (next_visit_weeks between 0 and 260);
