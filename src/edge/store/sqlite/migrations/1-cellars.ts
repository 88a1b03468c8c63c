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
-- Also "insert or replace" would change an entry, and without the triggers above.
create trigger entry_is_new before insert on entry
when new.entry <> 1 + coalesce((select entry from entry where cellar = new.cellar order by entry desc limit 1), 0)
  or exists (select 1 from entry where cellar = new.cellar and key = new.key)
  or exists (select 1 from entry where cellar = new.cellar and corrects = new.corrects)
begin select raise(abort, 'an entry of the log is new, and has the next number'); end;
create trigger touched_stays before update on touched
begin select raise(abort, 'an entry of the log is never changed'); end;
create trigger touched_is_kept before delete on touched
begin select raise(abort, 'an entry of the log is never deleted'); end;

-- How a large log is spread, fixed: SQLite chooses an index by it. Without, or with the figures of a young file, it
-- would look for the last entry of a person through all of them.
analyze;
insert into sqlite_stat1 (tbl, idx, stat) values
  ('entry', 'entry', '1000000 250000 1'),
  ('entry', 'entry_by_key', '1000000 250000 1'),
  ('entry', 'entry_by_time', '1000000 250000 1 1'),
  ('entry', 'entry_by_person', '1000000 250000 50000 1'),
  ('entry', 'entry_by_corrected', '20000 5000 1'),
  ('touched', 'touched', '1000000 250000 5000 1 1');

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
