import type { Delivered, FakeBotApi } from './fake-bot-api.ts';

type Extra = Record<string, unknown>;

/** What can be said of a group beside its people. */
export interface GroupOptions {
  readonly title?: string;
  readonly thread?: number;
  readonly begun_s?: number;
}

const BOT = { id: 4455667788, is_bot: true, first_name: 'brimnote', username: 'a_cellar_bot' };

/** A group of people with phones, and the bot in it. People are numbered from 7001 in the order of their first word. */
export class Group {
  readonly #api: FakeBotApi;
  readonly #options: GroupOptions;
  readonly #people: string[] = [];
  #messages = 0;
  id: number;

  constructor(api: FakeBotApi, id: number, options: GroupOptions = {}) {
    this.#api = api;
    this.id = id;
    this.#options = options;
  }

  /** Somebody brings the bot in. */
  invites(name: string): void {
    this.#api.offer({
      my_chat_member: {
        chat: this.#chat(),
        from: this.#from(name),
        date: this.#now_s(),
        old_chat_member: { status: 'left', user: BOT },
        new_chat_member: { status: 'member', user: BOT },
      },
    });
  }

  /** Somebody writes; gives back the number of the message. */
  says(name: string, content: string | Extra, more: Extra = {}): number {
    this.#messages += 1;
    this.#api.offer({ message: this.#message(name, this.#messages, content, more) });
    return this.#messages;
  }

  /** Somebody answers the bot's last message. */
  replies(name: string, text: string): number {
    return this.says(name, text, { reply_to_message: { message_id: 1, from: BOT } });
  }

  edits(name: string, number: number, text: string): void {
    const message = this.#message(name, number, text, { edit_date: this.#now_s() });
    this.#api.offer({ edited_message: message });
  }

  /** Somebody taps the button with this label under the last message that has one, or sends another key. */
  taps(name: string, label: string, forgedKey?: string): void {
    const key =
      forgedKey ??
      this.got.flatMap((one) => one.buttons).findLast((button) => button.text === label)?.callback_data;
    if (key === undefined) throw new Error(`Cannot tap as no button says "${label}"`);
    this.#messages += 1;
    const message = { message_id: this.got.at(-1)?.message_id ?? 1, date: 0, chat: this.#chat() };
    const tap = {
      id: `tap-${this.id}-${this.#messages}`,
      from: this.#from(name),
      chat_instance: '1',
      message,
    };
    this.#api.offer({ callback_query: { ...tap, data: key } });
  }

  /** The platform makes a supergroup of it, under another number. */
  becomes(id: number): void {
    this.says('nobody', { migrate_to_chat_id: id });
    this.id = id;
  }

  get got(): readonly Delivered[] {
    return this.#api.delivered.filter((one) => one.chat_id === this.id);
  }

  /** Resolves with the `count`th message of the bot when there are so many. */
  async reads(count: number): Promise<Delivered> {
    await this.#api.until(() => this.got.length >= count);
    return this.got[count - 1] as Delivered;
  }

  #now_s(): number {
    return (this.#options.begun_s ?? 1_767_000_000) + 10 * this.#messages;
  }

  #chat(): object {
    const { title = 'Hill <b>cellar</b> *1*' } = this.#options;
    return { id: this.id, type: this.id < -1e12 ? 'supergroup' : 'group', title };
  }

  #from(name: string): object {
    if (!this.#people.includes(name)) this.#people.push(name);
    return { id: 7001 + this.#people.indexOf(name), is_bot: false, first_name: name, language_code: 'en' };
  }

  #message(name: string, message_id: number, content: string | Extra, more: Extra): object {
    const fields = typeof content === 'string' ? { text: content } : content;
    const { thread } = this.#options;
    return {
      message_id,
      date: (this.#options.begun_s ?? 1_767_000_000) + 10 * message_id,
      chat: this.#chat(),
      from: this.#from(name),
      ...(thread !== undefined && { message_thread_id: thread, is_topic_message: true }),
      ...fields,
      ...more,
    };
  }
}
