/** What failed, and what made it fail, on one line and without a trace. */
export function faultText(fault: unknown): string {
  if (!(fault instanceof Error)) return String(fault);
  const { message, cause } = fault;
  return cause === undefined ? message : `${message} (${faultText(cause)})`;
}
