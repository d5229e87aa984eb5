/** What a Blob holds, read as text. */
export async function textOf(content: Blob | undefined): Promise<string> {
  return content === undefined ? '' : new TextDecoder().decode(await content.arrayBuffer());
}
