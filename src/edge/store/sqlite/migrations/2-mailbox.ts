/**
 * What arrived and what is to be sent. One index finds what waits (`handled_at` is null) and what was handled long ago.
 * The place of a post orders those that are there: when all are sent it may begin anew.
 */
export const MAILBOX = `
create table arrived (
  channel     text    not null,
  number      integer not null,
  received_at integer not null,
  tries       integer not null,
  handled_at  integer,
  cause       text,
  body        text    not null,
  primary key (channel, number)
) strict, without rowid;
create index arrived_by_end on arrived (channel, handled_at);

create table post (
  place   integer primary key,
  channel text    not null,
  id      text    not null,
  chat    text    not null,
  at      integer not null,
  body    text    not null
) strict;
create unique index post_by_id on post (channel, id);
`;
