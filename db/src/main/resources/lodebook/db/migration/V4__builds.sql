create table batch (
  id bigint not null,
  gear_revision_id bigint not null,
  gear_count bigint not null,
  serial_pattern varchar(60) not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_batch primary key (id),
  constraint fk_batch_code foreign key (id) references code (id),
  constraint fk_batch_gear foreign key (gear_revision_id) references gear_release (id),
  constraint ck_batch_count check (gear_count > 0)
);

-- gear_number: for which gear of its batch the rotor is, counted from 1; null for a rotor alone or a spare.
create table rotor (
  id bigint not null,
  layout_revision_id bigint not null,
  batch_id bigint,
  gear_number bigint,
  ring varchar(10),
  state varchar(20) not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_rotor primary key (id),
  constraint fk_rotor_code foreign key (id) references code (id),
  constraint fk_rotor_layout foreign key (layout_revision_id) references layout_release (id),
  constraint fk_rotor_batch foreign key (batch_id) references batch (id),
  constraint uq_rotor_state unique (id, state),
  constraint ck_rotor_ring check (ring in ('inner', 'outer')),
  constraint ck_rotor_state check (state in ('open', 'held', 'scrapped'))
);
create index ix_rotor_batch on rotor (batch_id);

create table rotor_state (
  id bigint not null,
  rotor_id bigint not null,
  state varchar(20) not null,
  why varchar(1000) not null,
  person_id bigint not null,
  stated_at timestamp(6) with time zone not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_rotor_state primary key (id),
  constraint fk_rotor_state_rotor foreign key (rotor_id) references rotor (id),
  constraint fk_rotor_state_person foreign key (person_id) references person (id)
);
create index ix_rotor_state_rotor on rotor_state (rotor_id);

-- stock_sequence: the last line of history that the plan had seen.
create table plan (
  id bigint not null,
  rotor_id bigint not null,
  seed bigint not null,
  settings varchar(1000) not null,
  program_version varchar(60) not null,
  stock_sequence bigint not null,
  unwanted_harmonics double precision not null,
  lower_bound double precision,
  as_they_come double precision not null,
  working_amplitude_tesla double precision not null,
  person_id bigint not null,
  stated_at timestamp(6) with time zone not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_plan primary key (id),
  constraint fk_plan_rotor foreign key (rotor_id) references rotor (id),
  constraint fk_plan_person foreign key (person_id) references person (id)
);
create index ix_plan_rotor on plan (rotor_id);

create table planned_placement (
  plan_id bigint not null,
  slot bigint not null,
  lot_id bigint not null,
  piece_id bigint,
  facing_degrees double precision not null,
  fill_step bigint not null,
  remark varchar(400) not null,
  constraint pk_planned_placement primary key (plan_id, slot),
  constraint uq_planned_placement_step unique (plan_id, fill_step),
  constraint fk_planned_placement_plan foreign key (plan_id) references plan (id),
  constraint fk_planned_placement_lot foreign key (lot_id) references lot (id),
  constraint fk_planned_placement_piece foreign key (piece_id) references piece (id)
);

-- The plan that counts for a rotor; the row goes when the plan is dropped, superseded or fully built.
create table live_plan (
  rotor_id bigint not null,
  plan_id bigint not null,
  constraint pk_live_plan primary key (rotor_id),
  constraint uq_live_plan_plan unique (plan_id),
  constraint fk_live_plan_rotor foreign key (rotor_id) references rotor (id),
  constraint fk_live_plan_plan foreign key (plan_id) references plan (id)
);

-- A piece that a plan keeps for a slot; the row goes when the piece is placed or the plan is dropped.
create table reserved_piece (
  piece_id bigint not null,
  plan_id bigint not null,
  slot bigint not null,
  constraint pk_reserved_piece primary key (piece_id),
  constraint uq_reserved_piece_slot unique (plan_id, slot),
  constraint fk_reserved_piece_piece foreign key (piece_id) references piece (id),
  constraint fk_reserved_piece_planned foreign key (plan_id, slot) references planned_placement (plan_id, slot)
);

-- What was really put where; append-only. piece_id null: an unmeasured magnet of the lot.
create table placement (
  id bigint not null,
  rotor_id bigint not null,
  slot bigint not null,
  lot_id bigint not null,
  piece_id bigint,
  facing_degrees double precision not null,
  deviation boolean not null,
  why varchar(1000) not null,
  person_id bigint not null,
  stated_at timestamp(6) with time zone not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_placement primary key (id),
  constraint uq_placement_slot unique (id, rotor_id, slot, lot_id),
  constraint fk_placement_rotor foreign key (rotor_id) references rotor (id),
  constraint fk_placement_lot foreign key (lot_id) references lot (id),
  constraint fk_placement_piece foreign key (piece_id) references piece (id),
  constraint fk_placement_person foreign key (person_id) references person (id),
  constraint ck_placement_slot check (slot > 0)
);
create index ix_placement_rotor on placement (rotor_id);
create index ix_placement_piece on placement (piece_id);
create index ix_placement_lot on placement (lot_id);

-- How a placement ended, once: corrected (the record was wrong from the start), reworked (the magnet was
-- changed from then on), scrapped (its piece was), removed.
create table placement_end (
  placement_id bigint not null,
  kind varchar(20) not null,
  superseded_by bigint,
  why varchar(1000) not null,
  person_id bigint not null,
  stated_at timestamp(6) with time zone not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_placement_end primary key (placement_id),
  constraint fk_placement_end_placement foreign key (placement_id) references placement (id),
  constraint fk_placement_end_by foreign key (superseded_by) references placement (id),
  constraint fk_placement_end_person foreign key (person_id) references person (id),
  constraint ck_placement_end_kind check (kind in ('corrected', 'reworked', 'scrapped', 'removed'))
);

-- What stands in a slot now. lot_clear follows the lot's own by the foreign key: a lot that may not be placed
-- is refused. Before a lot with placed pieces is put on hold, stood_before_hold is set on its rows.
create table live_slot (
  rotor_id bigint not null,
  slot bigint not null,
  placement_id bigint not null,
  lot_id bigint not null,
  lot_clear boolean not null,
  stood_before_hold boolean not null,
  constraint pk_live_slot primary key (rotor_id, slot),
  constraint uq_live_slot_placement unique (placement_id),
  constraint fk_live_slot_placement foreign key (placement_id, rotor_id, slot, lot_id)
    references placement (id, rotor_id, slot, lot_id),
  constraint fk_live_slot_lot_clear foreign key (lot_id, lot_clear) references lot (id, clear) on update cascade,
  constraint ck_live_slot_lot_clear check (lot_clear or stood_before_hold)
);
create index ix_live_slot_lot on live_slot (lot_id);

-- Where a piece stands now: at most one place. piece_clear works as lot_clear does.
create table live_placement (
  piece_id bigint not null,
  placement_id bigint not null,
  piece_clear boolean not null,
  stood_before_hold boolean not null,
  constraint pk_live_placement primary key (piece_id),
  constraint uq_live_placement_placement unique (placement_id),
  constraint fk_live_placement_slot foreign key (placement_id) references live_slot (placement_id),
  constraint fk_live_placement_piece_clear foreign key (piece_id, piece_clear) references piece (id, clear) on update cascade,
  constraint ck_live_placement_piece_clear check (piece_clear or stood_before_hold)
);
