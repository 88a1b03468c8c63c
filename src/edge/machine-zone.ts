/** The time zone of the machine by its name; undefined where it has none that has a name. */
export function machineZone(): string | undefined {
  // The type has it always; on a machine whose zone is a file of its own it is missing, or stands for one unknown.
  const zone = Intl.DateTimeFormat().resolvedOptions().timeZone as string | undefined;
  return zone === 'Etc/Unknown' ? undefined : zone;
}
