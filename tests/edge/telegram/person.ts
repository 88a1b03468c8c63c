import type { Delivered, FakeBotApi } from './fake-bot-api.ts';

type Extra = Record<string, unknown>;

/** Somebody with a phone, in a private chat with the bot. */
export class Person {
  readonly id: number;
  readonly #api: FakeBotApi;
  readonly #from: object;
  readonly #chat: object;
  readonly #begun_s: number;
  #messages = 0;

  /** `begun_s`: when the first message is sent, in seconds since 1970; each further one is a second later. */
  constructor(
    api: FakeBotApi,
    id: number,
    { language_code = 'en', begun_s = 1_767_000_000 }: { language_code?: string; begun_s?: number } = {},
  ) {
    this.#api = api;
    this.#begun_s = begun_s;
    this.id = id;
    this.#from = { id, is_bot: false, first_name: 'Rosa <b>', language_code };
    this.#chat = { id, type: 'private', first_name: 'Rosa <b>' };
  }

  /** Sends a message; `content` is its text, or the fields of another kind. */
  sends(content: string | Extra, options: { readonly twice?: boolean } = {}): void {
    this.#messages += 1;
    this.#api.offer({ message: this.#message(this.#messages, content) }, options);
  }

  /** Changes the last message. */
  edits(content: string | Extra): void {
    this.#api.offer({
      edited_message: { ...this.#message(this.#messages, content), edit_date: this.#begun_s + 500 },
    });
  }

  /** Taps the button with this label under the last message that has one. */
  taps(label: string): void {
    const key = this.got
      .flatMap((one) => one.buttons)
      .findLast((button) => button.text === label)?.callback_data;
    if (key === undefined) throw new Error(`Cannot tap as no button says "${label}"`);
    this.#messages += 1;
    const message = { message_id: 4000, date: 0, chat: this.#chat };
    const tap = { id: `tap-${this.#messages}`, from: this.#from, chat_instance: '1', message, data: key };
    this.#api.offer({ callback_query: tap });
  }

  /** What this person got so far. */
  get got(): readonly Delivered[] {
    return this.#api.delivered.filter((one) => one.chat_id === this.id);
  }

  get texts(): readonly string[] {
    return this.got.map((one) => one.text);
  }

  /** Resolves with the text of the `count`th message when this person has got so many. */
  async reads(count: number): Promise<string> {
    await this.#api.until(() => this.got.length >= count);
    return this.texts[count - 1] ?? '';
  }

  #message(message_id: number, content: string | Extra): object {
    const fields = typeof content === 'string' ? { text: content } : content;
    return { message_id, date: this.#begun_s + message_id, chat: this.#chat, from: this.#from, ...fields };
  }
}
