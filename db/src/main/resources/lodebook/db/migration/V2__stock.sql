create table meter (
  id bigint not null,
  kind varchar(20) not null,
  accuracy_relative double precision not null,
  floor_tesla double precision not null,
  sensing_depth_metres double precision not null,
  retired boolean not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_meter primary key (id),
  constraint fk_meter_code foreign key (id) references code (id),
  constraint ck_meter_kind check (kind in ('field', 'length', 'torque')),
  constraint ck_meter_accuracy check (accuracy_relative >= 0 and floor_tesla >= 0 and sensing_depth_metres >= 0)
);

-- Calibrations over time; the latest recorded counts. Dates are ISO 8601 (2026-05-12), '' where none is known.
create table meter_calibration (
  id bigint not null,
  meter_id bigint not null,
  calibrated_on varchar(10) not null,
  due_on varchar(10) not null,
  certificate varchar(100) not null,
  found_off_relative double precision,
  person_id bigint not null,
  stated_at timestamp(6) with time zone not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_meter_calibration primary key (id),
  constraint fk_meter_calibration_meter foreign key (meter_id) references meter (id),
  constraint fk_meter_calibration_person foreign key (person_id) references person (id)
);
create index ix_meter_calibration_meter on meter_calibration (meter_id);

create table grade (
  id bigint not null,
  folded varchar(40) not null,
  name varchar(40) not null,
  remanence_low_tesla double precision not null,
  remanence_high_tesla double precision not null,
  remanence_per_kelvin double precision not null,
  recoil_permeability double precision not null,
  highest_temperature_celsius double precision not null,
  density_kilogram_per_cubic_metre double precision not null,
  source varchar(400) not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_grade primary key (id),
  constraint uq_grade_name unique (folded),
  constraint ck_grade_remanence check (0 < remanence_low_tesla and remanence_low_tesla <= remanence_high_tesla),
  constraint ck_grade_recoil check (recoil_permeability >= 1)
);

create table magnet_type (
  id bigint not null,
  folded varchar(60) not null,
  name varchar(60) not null,
  shape varchar(20) not null,
  thickness_metres double precision not null,
  width_metres double precision not null,
  length_metres double precision not null,
  diameter_metres double precision not null,
  inner_diameter_metres double precision not null,
  arc_degrees double precision not null,
  grade_id bigint not null,
  tolerance_metres double precision not null,
  coating varchar(100) not null,
  recoil_permeability double precision not null,
  magnetisation_degrees double precision not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_magnet_type primary key (id),
  constraint uq_magnet_type_name unique (folded),
  constraint fk_magnet_type_grade foreign key (grade_id) references grade (id),
  constraint ck_magnet_type_shape check (shape in ('block', 'disc', 'rod', 'arc')),
  constraint ck_magnet_type_recoil check (recoil_permeability >= 1)
);

-- clear says whether a piece of the lot may be planned and placed; live_slot follows it by foreign key.
-- placed_count and scrapped_count are kept by the operations, so that the check can hold them.
create table lot (
  id bigint not null,
  type_id bigint not null,
  supplier varchar(200) not null,
  supplier_lot varchar(100) not null,
  supplier_lot_folded varchar(100) not null,
  received_on varchar(10) not null,
  piece_count bigint not null,
  placed_count bigint not null,
  scrapped_count bigint not null,
  certificate varchar(200) not null,
  certificate_remanence_tesla double precision,
  location varchar(200) not null,
  state varchar(20) not null,
  state_before_hold varchar(20),
  clear boolean not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_lot primary key (id),
  constraint fk_lot_code foreign key (id) references code (id),
  constraint fk_lot_type foreign key (type_id) references magnet_type (id),
  constraint uq_lot_clear unique (id, clear),
  constraint ck_lot_state check (state in ('awaiting', 'accepted', 'held', 'rejected')),
  constraint ck_lot_clear check (clear = (state = 'accepted')),
  constraint ck_lot_held_from check ((state = 'held') = (state_before_hold is not null)),
  constraint ck_lot_count check (placed_count >= 0 and scrapped_count >= 0 and placed_count + scrapped_count <= piece_count)
);
create index ix_lot_supplier_lot on lot (supplier_lot_folded);

create table lot_state (
  id bigint not null,
  lot_id bigint not null,
  state varchar(20) not null,
  why varchar(1000) not null,
  person_id bigint not null,
  stated_at timestamp(6) with time zone not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_lot_state primary key (id),
  constraint fk_lot_state_lot foreign key (lot_id) references lot (id),
  constraint fk_lot_state_person foreign key (person_id) references person (id)
);
create index ix_lot_state_lot on lot_state (lot_id);

-- The current strength stands here, null while the piece counts as unmeasured; earlier ones in piece_strength.
create table piece (
  id bigint not null,
  lot_id bigint not null,
  number bigint not null,
  state varchar(20) not null,
  clear boolean not null,
  remanence_tesla double precision,
  remanence_uncertainty_tesla double precision,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_piece primary key (id),
  constraint uq_piece_number unique (lot_id, number),
  constraint uq_piece_clear unique (id, clear),
  constraint fk_piece_lot foreign key (lot_id) references lot (id),
  constraint ck_piece_number check (number > 0),
  constraint ck_piece_state check (state in ('usable', 'held', 'scrapped')),
  constraint ck_piece_clear check (clear = (state = 'usable')),
  constraint ck_piece_strength check ((remanence_tesla is null) = (remanence_uncertainty_tesla is null))
);

create table piece_state (
  id bigint not null,
  piece_id bigint not null,
  state varchar(20) not null,
  why varchar(1000) not null,
  person_id bigint not null,
  stated_at timestamp(6) with time zone not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_piece_state primary key (id),
  constraint fk_piece_state_piece foreign key (piece_id) references piece (id),
  constraint fk_piece_state_person foreign key (person_id) references person (id)
);
create index ix_piece_state_piece on piece_state (piece_id);

-- A reading the same as an earlier one of its piece has the same fingerprint; taken in again with a
-- reason it gets the next repeat number. doubted: taken before its tray was declared unsure.
create table piece_reading (
  id bigint not null,
  piece_id bigint not null,
  flux_tesla double precision not null,
  standoff_metres double precision not null,
  temperature_celsius double precision,
  meter_id bigint,
  person_id bigint not null,
  fingerprint varchar(64) not null,
  repeat_number bigint not null,
  doubted boolean not null,
  stated_at timestamp(6) with time zone not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_piece_reading primary key (id),
  constraint uq_piece_reading_once unique (piece_id, fingerprint, repeat_number),
  constraint fk_piece_reading_piece foreign key (piece_id) references piece (id),
  constraint fk_piece_reading_meter foreign key (meter_id) references meter (id),
  constraint fk_piece_reading_person foreign key (person_id) references person (id),
  constraint ck_piece_reading_north check (flux_tesla >= 0)
);

-- Every estimate of a piece's strength ever made; the latest is repeated in piece.
create table piece_strength (
  id bigint not null,
  piece_id bigint not null,
  remanence_tesla double precision not null,
  remanence_uncertainty_tesla double precision not null,
  readings bigint not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_piece_strength primary key (id),
  constraint fk_piece_strength_piece foreign key (piece_id) references piece (id)
);
create index ix_piece_strength_piece on piece_strength (piece_id);

create table tray (
  id bigint not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_tray primary key (id),
  constraint fk_tray_code foreign key (id) references code (id)
);

-- What lies where now; rows go when a piece is taken out.
create table cell_content (
  tray_id bigint not null,
  cell varchar(20) not null,
  piece_id bigint not null,
  constraint pk_cell_content primary key (tray_id, cell),
  constraint uq_cell_content_piece unique (piece_id),
  constraint fk_cell_content_tray foreign key (tray_id) references tray (id),
  constraint fk_cell_content_piece foreign key (piece_id) references piece (id)
);
