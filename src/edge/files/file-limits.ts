/** What a file to read may be at most: whoever sends one may mean harm, or have mistaken it for another. */
export const FILE_LIMITS = {
  /** Bytes of a file. */
  bytes: 512 * 1024,
  /** Bytes of our own export, known by its headings: a year of 5,000 entries has about 2 MB as text. */
  own_bytes: 8 * 1024 * 1024,
  rows: 20_000,
  columns: 200,
  /** Letters of one cell; a remark is a message at most. */
  letters: 8192,
  /** Bytes that the parts of a spreadsheet may unpack to. */
  unpacked_bytes: 24 * 1024 * 1024,
  /** How long reading may take, in milliseconds. */
  time_ms: 20_000,
  /** Memory of reading, in MB. */
  memory_MB: 256,
} as const;
