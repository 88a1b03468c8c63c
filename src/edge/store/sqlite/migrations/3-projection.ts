/** By which rule the vessels were derived from the log: one row. 0 is no rule, so that they are derived anew. */
export const PROJECTION = `
create table projection (
  version integer not null
) strict;
insert into projection values (0);
`;
