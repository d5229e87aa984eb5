/** A name under which every file system takes a file; letters of all scripts stay. */
export function fileNameOf(name: string, extension: string): string {
  return `${name.replace(/[\\/:*?"<>|\u0000-\u001f]/gu, '-').trim()}.${extension}`;
}
