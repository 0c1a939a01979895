-- The survey's number, S-12, is its code.
create table survey (
  id bigint not null,
  rotor_id bigint not null,
  voided boolean not null,
  person_id bigint not null,
  stated_at timestamp(6) with time zone not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_survey primary key (id),
  constraint fk_survey_code foreign key (id) references code (id),
  constraint fk_survey_rotor foreign key (rotor_id) references rotor (id),
  constraint fk_survey_person foreign key (person_id) references person (id)
);
create index ix_survey_rotor on survey (rotor_id);

-- What was done to a survey after it was taken in: declared void, or moved from the rotor under which it
-- was entered by mistake.
create table survey_change (
  id bigint not null,
  survey_id bigint not null,
  kind varchar(20) not null,
  from_rotor_id bigint not null,
  to_rotor_id bigint not null,
  why varchar(1000) not null,
  person_id bigint not null,
  stated_at timestamp(6) with time zone not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_survey_change primary key (id),
  constraint fk_survey_change_survey foreign key (survey_id) references survey (id),
  constraint fk_survey_change_from foreign key (from_rotor_id) references rotor (id),
  constraint fk_survey_change_to foreign key (to_rotor_id) references rotor (id),
  constraint fk_survey_change_person foreign key (person_id) references person (id),
  constraint ck_survey_change_kind check (kind in ('void', 'move'))
);
create index ix_survey_change_survey on survey_change (survey_id);

-- Each reading has its own person and meter. number: its place among the survey's readings, in the order
-- in which they came; unit: the one in which it was stated; no radius or height: the layout's probe.
create table reading (
  id bigint not null,
  survey_id bigint not null,
  number bigint not null,
  slot bigint not null,
  spot varchar(20) not null,
  component varchar(20) not null,
  flux_tesla double precision not null,
  unit varchar(5) not null,
  temperature_celsius double precision,
  radius_metres double precision,
  height_metres double precision,
  meter_id bigint not null,
  person_id bigint not null,
  stated_at timestamp(6) with time zone not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_reading primary key (id),
  constraint uq_reading_number unique (survey_id, number),
  constraint fk_reading_survey foreign key (survey_id) references survey (id),
  constraint fk_reading_meter foreign key (meter_id) references meter (id),
  constraint fk_reading_person foreign key (person_id) references person (id),
  constraint ck_reading_words check (slot > 0 and spot in ('centre', 'to-next') and component in ('radial', 'tangential')
    and unit in ('mT', 'T', 'G', 'kG'))
);

-- What a check of a survey said when it was made; the latest of a survey counts, as long as neither
-- readings nor placements changed after it.
create table survey_check (
  id bigint not null,
  survey_id bigint not null,
  verdict varchar(20) not null,
  reason varchar(40) not null,
  measuring varchar(400) not null,
  fit_probability double precision not null,
  person_id bigint not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_survey_check primary key (id),
  constraint fk_survey_check_survey foreign key (survey_id) references survey (id),
  constraint fk_survey_check_person foreign key (person_id) references person (id),
  constraint ck_survey_check_verdict check (verdict in ('pass', 'fault', 'cannot tell'))
);
create index ix_survey_check_survey on survey_check (survey_id);

create table finding (
  survey_check_id bigint not null,
  number bigint not null,
  slot bigint not null,
  kind varchar(40) not null,
  should_face_degrees double precision,
  faces_degrees double precision,
  by_degrees double precision,
  strength_relative double precision,
  probability double precision,
  constraint pk_finding primary key (survey_check_id, number),
  constraint fk_finding_check foreign key (survey_check_id) references survey_check (id)
);

create table unit (
  id bigint not null,
  gear_revision_id bigint not null,
  batch_id bigint,
  state varchar(20) not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_unit primary key (id),
  constraint fk_unit_code foreign key (id) references code (id),
  constraint fk_unit_gear foreign key (gear_revision_id) references gear_release (id),
  constraint fk_unit_batch foreign key (batch_id) references batch (id)
);
create index ix_unit_batch on unit (batch_id);

create table unit_state (
  id bigint not null,
  unit_id bigint not null,
  state varchar(20) not null,
  why varchar(1000) not null,
  person_id bigint not null,
  stated_at timestamp(6) with time zone not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_unit_state primary key (id),
  constraint fk_unit_state_unit foreign key (unit_id) references unit (id),
  constraint fk_unit_state_person foreign key (person_id) references person (id)
);
create index ix_unit_state_unit on unit_state (unit_id);

-- What went into what (a rotor, another part; by its code), from when to when.
create table membership (
  id bigint not null,
  holder_id bigint not null,
  member_id bigint not null,
  position varchar(20) not null,
  why varchar(1000) not null,
  person_id bigint not null,
  from_at timestamp(6) with time zone not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_membership primary key (id),
  constraint fk_membership_holder foreign key (holder_id) references code (id),
  constraint fk_membership_member foreign key (member_id) references code (id),
  constraint fk_membership_person foreign key (person_id) references person (id)
);
create index ix_membership_holder on membership (holder_id);
create index ix_membership_member on membership (member_id);

create table membership_end (
  membership_id bigint not null,
  why varchar(1000) not null,
  person_id bigint not null,
  to_at timestamp(6) with time zone not null,
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_membership_end primary key (membership_id),
  constraint fk_membership_end_membership foreign key (membership_id) references membership (id),
  constraint fk_membership_end_person foreign key (person_id) references person (id)
);

-- A rotor is in at most one unit at a time, and a unit has one rotor in each position.
create table live_rotor (
  rotor_id bigint not null,
  unit_id bigint not null,
  position varchar(20) not null,
  membership_id bigint not null,
  constraint pk_live_rotor primary key (rotor_id),
  constraint uq_live_rotor_position unique (unit_id, position),
  constraint fk_live_rotor_rotor foreign key (rotor_id) references rotor (id),
  constraint fk_live_rotor_unit foreign key (unit_id) references unit (id),
  constraint fk_live_rotor_membership foreign key (membership_id) references membership (id)
);
