/**
 * The first form. `strict` holds the types of the columns; without a rowid a table is its own index. An entry is found
 * by its number, its key, its time, by whom it is and by what it corrects, and through `touched` by each vessel it is
 * about. The triggers keep the log append-only whoever writes.
 */
export const CELLARS = `
create table cellar (
  cellar text not null primary key
) strict, without rowid;

create table entry (
  cellar   text    not null,
  entry    integer not null,
  key      text    not null,
  at       integer not null,
  noted_at integer not null,
  person   integer not null,
  kind     text    not null,
  corrects integer,
  content  text    not null,
  primary key (cellar, entry)
) strict, without rowid;
create unique index entry_by_key on entry (cellar, key);
create index entry_by_time on entry (cellar, at, entry);
create index entry_by_person on entry (cellar, person, entry) where kind <> 'correction';
create unique index entry_by_corrected on entry (cellar, corrects) where corrects is not null;

create table touched (
  cellar text    not null,
  vessel text    not null,
  at     integer not null,
  entry  integer not null,
  primary key (cellar, vessel, at, entry)
) strict, without rowid;

create trigger entry_stays before update on entry
begin select raise(abort, 'an entry of the log is never changed'); end;
create trigger entry_is_kept before delete on entry
begin select raise(abort, 'an entry of the log is never deleted'); end;
create trigger touched_stays before update on touched
begin select raise(abort, 'an entry of the log is never changed'); end;
create trigger touched_is_kept before delete on touched
begin select raise(abort, 'an entry of the log is never deleted'); end;

create table vessel (
  cellar text    not null,
  vessel text    not null,
  at     integer not null,
  entry  integer not null,
  run    integer not null,
  state  text,
  primary key (cellar, vessel)
) strict;
create table waypoint (
  cellar text    not null,
  vessel text    not null,
  at     integer not null,
  entry  integer not null,
  run    integer not null,
  state  text,
  primary key (cellar, vessel, at, entry)
) strict;

create table kept (
  cellar text not null,
  key    text not null,
  text   text not null,
  until  integer,
  primary key (cellar, key)
) strict;
create index kept_by_end on kept (cellar, until) where until is not null;

create table person (
  cellar text    not null,
  number integer not null,
  id     text,
  name   text,
  primary key (cellar, number)
) strict, without rowid;
create unique index person_by_id on person (cellar, id) where id is not null;

create table due (
  cellar       text    not null,
  id           text    not null,
  chat         text    not null,
  at           integer not null,
  about        text    not null,
  leased_until integer not null,
  open_at      integer not null,
  said         integer not null,
  primary key (cellar, id)
) strict, without rowid;
create index due_by_opening on due (open_at) where said = 0;
create index due_by_cellar on due (cellar, at) where said = 0;
`;
