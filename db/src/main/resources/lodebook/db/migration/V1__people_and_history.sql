-- The head of the book: who writes, takes this one row first. It gives out sequence numbers of the
-- history and ids, and says which generation of tables this is and how often the book was changed.
create table chain_head (
  id bigint not null,
  sequence bigint not null,
  hash varchar(64) not null,
  next_id bigint not null,
  generation bigint not null,
  revision bigint not null,
  book_name varchar(100) not null,
  created_at timestamp(6) with time zone not null,
  constraint pk_chain_head primary key (id),
  constraint ck_chain_head_one_row check (id = 1)
);

-- Numbers that people see and the book gives: S-12, N-7.
create table counter (
  prefix varchar(10) not null,
  next_number bigint not null,
  constraint pk_counter primary key (prefix),
  constraint ck_counter_positive check (next_number > 0)
);

create table setting (
  name varchar(60) not null,
  content varchar(400) not null,
  constraint pk_setting primary key (name)
);

create table station (
  id bigint not null,
  name varchar(100) not null,
  constraint pk_station primary key (id),
  constraint uq_station_name unique (name)
);

-- Initials are compared without regard to case: folded is what is compared, initials what is shown.
create table person (
  id bigint not null,
  folded varchar(20) not null,
  initials varchar(20) not null,
  name varchar(200) not null,
  role varchar(20) not null,
  retired boolean not null,
  pin_hash varchar(200),
  recorded_at timestamp(6) with time zone not null,
  history_sequence bigint not null,
  constraint pk_person primary key (id),
  constraint uq_person_initials unique (folded),
  constraint ck_person_role check (role in ('bench', 'inspector', 'planner', 'lead'))
);

-- One line for each operation. What is hashed is the stored text; where it is longer than the column,
-- it goes on in history_continued. The other columns repeat what the text says, to search by.
create table history (
  sequence bigint not null,
  stated_at timestamp(6) with time zone not null,
  recorded_at timestamp(6) with time zone not null,
  initials varchar(20) not null,
  station varchar(100) not null,
  operation varchar(60) not null,
  content varchar(32000) not null,
  hash varchar(64) not null,
  constraint pk_history primary key (sequence),
  constraint uq_history_hash unique (hash)
);

create table history_continued (
  sequence bigint not null,
  part bigint not null,
  content varchar(32000) not null,
  constraint pk_history_continued primary key (sequence, part),
  constraint fk_history_continued_line foreign key (sequence) references history (sequence)
);

-- Which codes a line speaks of, folded.
create table history_subject (
  sequence bigint not null,
  folded varchar(60) not null,
  constraint pk_history_subject primary key (sequence, folded),
  constraint fk_history_subject_line foreign key (sequence) references history (sequence)
);
create index ix_history_subject_folded on history_subject (folded, sequence);

-- The one space of numbers: whatever carries a number of the shop has its row here, with the same id.
create table code (
  id bigint not null,
  folded varchar(60) not null,
  shown varchar(60) not null,
  kind varchar(20) not null,
  constraint pk_code primary key (id),
  constraint uq_code_folded unique (folded),
  constraint uq_code_kind unique (id, kind)
);
