/** The name under which the store keeps what comes from this platform and goes to it. */
export const CHANNEL = 'telegram';
