create table layout (
  id bigint not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_layout primary key (id),
  constraint fk_layout_code foreign key (id) references code (id)
);

-- side_type_id is the same as type_id where a layout names no other; adhesive_minutes 0 says nothing.
-- spots and components are words with commas between them, in the order in which they are taken.
create table layout_revision (
  id bigint not null,
  layout_id bigint not null,
  revision varchar(20) not null,
  pole_pairs bigint not null,
  segments_per_pole_pair bigint not null,
  focus varchar(10) not null,
  numbering varchar(20) not null,
  first_slot_clock_degrees double precision not null,
  first_facing_degrees double precision not null,
  slot_radius_metres double precision not null,
  type_id bigint not null,
  side_type_id bigint not null,
  working_radius_metres double precision not null,
  probe_radius_metres double precision not null,
  probe_height_metres double precision not null,
  probe_spots varchar(60) not null,
  probe_components varchar(60) not null,
  pocket_metres double precision not null,
  facing_degrees double precision not null,
  probe_metres double precision not null,
  probe_tilt_degrees double precision not null,
  adhesive varchar(200) not null,
  adhesive_minutes double precision not null,
  body_turns boolean not null,
  insert_from varchar(10) not null,
  amplitude_tolerance_relative double precision not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_layout_revision primary key (id),
  constraint uq_layout_revision_name unique (layout_id, revision),
  constraint fk_layout_revision_layout foreign key (layout_id) references layout (id),
  constraint fk_layout_revision_type foreign key (type_id) references magnet_type (id),
  constraint fk_layout_revision_side foreign key (side_type_id) references magnet_type (id),
  constraint ck_layout_revision_poles check (pole_pairs > 0 and segments_per_pole_pair > 1),
  constraint ck_layout_revision_words check (focus in ('in', 'out') and numbering in ('clockwise', 'counterclockwise')
    and insert_from in ('face', 'outside', 'inside')),
  constraint uq_layout_revision_all unique (id, layout_id, revision, pole_pairs, segments_per_pole_pair, focus, numbering,
    first_slot_clock_degrees, first_facing_degrees, slot_radius_metres, type_id, side_type_id, working_radius_metres,
    probe_radius_metres, probe_height_metres, probe_spots, probe_components, pocket_metres, facing_degrees, probe_metres,
    probe_tilt_degrees, adhesive, adhesive_minutes, body_turns, insert_from, amplitude_tolerance_relative)
);

-- A released revision repeats everything it says; the foreign key over all columns keeps both as they are.
create table layout_release (
  id bigint not null,
  layout_id bigint not null,
  revision varchar(20) not null,
  pole_pairs bigint not null,
  segments_per_pole_pair bigint not null,
  focus varchar(10) not null,
  numbering varchar(20) not null,
  first_slot_clock_degrees double precision not null,
  first_facing_degrees double precision not null,
  slot_radius_metres double precision not null,
  type_id bigint not null,
  side_type_id bigint not null,
  working_radius_metres double precision not null,
  probe_radius_metres double precision not null,
  probe_height_metres double precision not null,
  probe_spots varchar(60) not null,
  probe_components varchar(60) not null,
  pocket_metres double precision not null,
  facing_degrees double precision not null,
  probe_metres double precision not null,
  probe_tilt_degrees double precision not null,
  adhesive varchar(200) not null,
  adhesive_minutes double precision not null,
  body_turns boolean not null,
  insert_from varchar(10) not null,
  amplitude_tolerance_relative double precision not null,
  released_by bigint not null,
  released_at timestamp(6) with time zone not null,
  release_sequence bigint not null,
  constraint pk_layout_release primary key (id),
  constraint fk_layout_release_person foreign key (released_by) references person (id),
  constraint fk_layout_release_all foreign key (id, layout_id, revision, pole_pairs, segments_per_pole_pair, focus, numbering,
    first_slot_clock_degrees, first_facing_degrees, slot_radius_metres, type_id, side_type_id, working_radius_metres,
    probe_radius_metres, probe_height_metres, probe_spots, probe_components, pocket_metres, facing_degrees, probe_metres,
    probe_tilt_degrees, adhesive, adhesive_minutes, body_turns, insert_from, amplitude_tolerance_relative)
    references layout_revision (id, layout_id, revision, pole_pairs, segments_per_pole_pair, focus, numbering,
    first_slot_clock_degrees, first_facing_degrees, slot_radius_metres, type_id, side_type_id, working_radius_metres,
    probe_radius_metres, probe_height_metres, probe_spots, probe_components, pocket_metres, facing_degrees, probe_metres,
    probe_tilt_degrees, adhesive, adhesive_minutes, body_turns, insert_from, amplitude_tolerance_relative)
);

create table gear_model (
  id bigint not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_gear_model primary key (id),
  constraint fk_gear_model_code foreign key (id) references code (id)
);

-- A radius or torque of 0 says that the model does not name it.
create table gear_revision (
  id bigint not null,
  gear_id bigint not null,
  revision varchar(20) not null,
  inner_layout_id bigint not null,
  outer_layout_id bigint not null,
  modulator_pieces bigint not null,
  held varchar(20) not null,
  modulator_inner_radius_metres double precision not null,
  modulator_outer_radius_metres double precision not null,
  stack_metres double precision not null,
  required_pull_out_newton_metres double precision not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_gear_revision primary key (id),
  constraint uq_gear_revision_name unique (gear_id, revision),
  constraint fk_gear_revision_gear foreign key (gear_id) references gear_model (id),
  constraint fk_gear_revision_inner foreign key (inner_layout_id) references layout_revision (id),
  constraint fk_gear_revision_outer foreign key (outer_layout_id) references layout_revision (id),
  constraint ck_gear_revision_held check (held in ('outer', 'modulator', 'inner')),
  constraint uq_gear_revision_all unique (id, gear_id, revision, inner_layout_id, outer_layout_id, modulator_pieces, held,
    modulator_inner_radius_metres, modulator_outer_radius_metres, stack_metres, required_pull_out_newton_metres)
);

create table gear_release (
  id bigint not null,
  gear_id bigint not null,
  revision varchar(20) not null,
  inner_layout_id bigint not null,
  outer_layout_id bigint not null,
  modulator_pieces bigint not null,
  held varchar(20) not null,
  modulator_inner_radius_metres double precision not null,
  modulator_outer_radius_metres double precision not null,
  stack_metres double precision not null,
  required_pull_out_newton_metres double precision not null,
  released_by bigint not null,
  released_at timestamp(6) with time zone not null,
  release_sequence bigint not null,
  constraint pk_gear_release primary key (id),
  constraint fk_gear_release_person foreign key (released_by) references person (id),
  constraint fk_gear_release_inner foreign key (inner_layout_id) references layout_release (id),
  constraint fk_gear_release_outer foreign key (outer_layout_id) references layout_release (id),
  constraint fk_gear_release_all foreign key (id, gear_id, revision, inner_layout_id, outer_layout_id, modulator_pieces, held,
    modulator_inner_radius_metres, modulator_outer_radius_metres, stack_metres, required_pull_out_newton_metres)
    references gear_revision (id, gear_id, revision, inner_layout_id, outer_layout_id, modulator_pieces, held,
    modulator_inner_radius_metres, modulator_outer_radius_metres, stack_metres, required_pull_out_newton_metres)
);
