/** Runs work under a name when all earlier work under that name has ended, well or badly. */
export type TakeTurns = <T>(name: string, work: () => Promise<T>) => Promise<T>;

/** Makes a queue for each name; one that nobody waits in is forgotten. */
export function makeTakeTurns(): TakeTurns {
  const last = new Map<string, Promise<void>>();
  return (name, work) => {
    const mine = (last.get(name) ?? Promise.resolve()).then(work);
    const done = mine
      .then(
        () => undefined,
        () => undefined,
      )
      .then(() => {
        if (last.get(name) === done) last.delete(name);
      });
    last.set(name, done);
    return mine;
  };
}
