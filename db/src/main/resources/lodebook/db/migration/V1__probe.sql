create table probe (id bigint primary key, code varchar(40) not null, at timestamp(6) with time zone not null);
