import type { Post } from '../../core/cellar/mailbox.ts';
import { readBody } from './body.ts';
import { LONGEST_TEXT } from './split-text.ts';

/** What stands between two texts. */
const GAP = '\n\n';

/** What is sent in one call, and the posts that are settled by it. */
export interface Parcel {
  readonly posts: readonly Post[];
  readonly body: string;
}

/**
 * Makes one message of the first of those that wait for a chat and the ones behind it, where that loses nothing: plain
 * texts without buttons, as long as they fit.
 */
export function mergePosts(first: Post, waiting: readonly Post[]): Parcel {
  const posts = [first];
  let text = plainTextOf(first);
  while (text !== undefined) {
    const post = waiting[posts.length];
    const next = post && plainTextOf(post);
    if (next === undefined || text.length + next.length + GAP.length > LONGEST_TEXT) break;
    text += GAP + next;
    posts.push(post as Post);
  }
  if (posts.length === 1) return { posts, body: first.body };
  const { method, params } = readBody(first.body);
  return { posts, body: JSON.stringify({ method, params: { ...params, text } }) };
}

function plainTextOf({ body }: Post): string | undefined {
  const { method, params, isCorrection } = readBody(body);
  const { text } = params;
  if (isCorrection) return undefined;
  const isPlain = Object.keys(params).every((name) => name === 'text' || name === 'link_preview_options');
  return method === 'sendMessage' && isPlain && typeof text === 'string' ? text : undefined;
}
