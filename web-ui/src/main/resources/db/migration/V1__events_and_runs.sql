create table event (
  id bigint generated always as identity primary key,
  name varchar(200) not null,
  sample varchar(300) unique,
  opened boolean not null,
  changed timestamp with time zone not null
);

create table event_file (
  event_id bigint not null references event (id) on delete cascade,
  path varchar(300) not null,
  content text not null,
  primary key (event_id, path)
);

create table search_run (
  id bigint generated always as identity primary key,
  event_id bigint references event (id) on delete set null,
  event_name varchar(200) not null,
  inputs text not null,
  seed bigint not null,
  threads int not null,
  max_evaluations int not null,
  version varchar(100) not null,
  state varchar(20) not null,
  started timestamp with time zone not null,
  ended timestamp with time zone,
  progress text not null,
  result text,
  message text
);
