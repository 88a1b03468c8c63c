import type { Api } from 'grammy';

import { createLeanFetch } from './lean-fetch.ts';
import { clientSignal } from './platform.ts';

/** Where the bytes of a file are. */
export interface FilePlace {
  readonly api: Api;
  readonly token: string;
  /** Where the Bot API is, without a slash at the end. */
  readonly root: string;
  /** More than so many bytes are not taken. */
  readonly longest_bytes: number;
  readonly signal: AbortSignal;
}

/** A path as the platform gives it: into folders below, never out of them. */
const PATH = /^(?!.*\.\.)\w[\w./-]*$/;

/** Fetches a file that somebody sent; undefined where it is too long. Rejects where the platform does not hand it over. */
export async function fetchFile(
  fileId: string,
  { api, token, root, longest_bytes, signal }: FilePlace,
): Promise<Uint8Array | undefined> {
  const { file_path: path = '', file_size = 0 } = await api.getFile(fileId, clientSignal(signal));
  if (file_size > longest_bytes) return undefined;
  // Neither the path nor the address stands in the error: the one is strange, the other holds the token.
  if (!PATH.test(path)) throw new Error('the platform gave no path of a file');
  const fetch = createLeanFetch();
  try {
    const response = await fetch(`${root}/file/bot${token}/${path}`, { signal, longest_bytes });
    if (response.status !== 200) throw new Error(`a file was not handed over (${response.status})`);
    return response.bytes();
  } finally {
    fetch.close();
  }
}
