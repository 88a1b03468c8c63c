export type Params = Record<string, unknown>;
/** A file that came with a call. */
export type Upload = { readonly name: string; readonly bytes: Uint8Array };

/** The parameters of a call, and the file that came with it. What is no text is written as JSON in a form. */
export async function readCall(body: Buffer, type: string): Promise<{ params: Params; file?: Upload }> {
  if (!type.startsWith('multipart/form-data'))
    return { params: JSON.parse(body.length === 0 ? '{}' : body.toString()) as Params };
  const form = await new Response(new Uint8Array(body), { headers: { 'content-type': type } }).formData();
  const params: Params = {};
  let file: Upload | undefined;
  for (const [name, value] of form) {
    if (typeof value === 'string')
      params[name] = /^(-?\d+$|[{[]|true$|false$)/.test(value) ? JSON.parse(value) : value;
    else file = { name: value.name, bytes: new Uint8Array(await value.arrayBuffer()) };
  }
  return { params, ...(file && { file }) };
}
