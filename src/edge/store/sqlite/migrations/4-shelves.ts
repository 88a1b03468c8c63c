/**
 * The chemical store. What is on a shelf is derived from the log as vessels are; the additive of what came in or went out
 * is found by an index, where a shelf must be derived from a moment on. The spread of that index is fixed, as of the
 * others.
 */
export const SHELVES = `
create table shelf (
  cellar text not null,
  shelf  text not null,
  state  text not null,
  primary key (cellar, shelf)
) strict, without rowid;

alter table entry add column additive text
  generated always as (case when kind in ('addition', 'stock') then json_extract(content, '$.additive') end) virtual;
create index entry_by_additive on entry (cellar, additive, at, entry) where additive is not null;
insert into sqlite_stat1 (tbl, idx, stat) values ('entry', 'entry_by_additive', '500000 125000 40000 1 1');
`;
