import type { IncomingMessage } from '../../chat/conversation/ports.ts';

/** Where in a chat something is said. */
export interface Spot {
  /** The platform's own number of the chat. */
  readonly chatId: number;
  /** The topic of a group that has topics. */
  readonly threadId?: number;
  /** The message that it answers, where several people write. */
  readonly replyTo?: number;
}

/** A file that somebody sent, still with the platform. */
export interface ArrivedFile {
  readonly fileId: string;
  readonly size_bytes?: number;
}

/** An update that is to be answered. */
export interface Arrival extends Spot {
  readonly updateId: number;
  /** Milliseconds since 1970. */
  readonly received_at: number;
  readonly message: IncomingMessage;
  /** The tap that the platform waits to hear about; only with a press. */
  readonly tapId?: string;
  /** A sheet that can be read. */
  readonly file?: ArrivedFile;
  /** Whether it was kept in the end: it is handled before that is known. Absent: it was. */
  readonly isKept?: Promise<boolean>;
  /** We were brought into the group. */
  readonly isJoin?: true;
}
