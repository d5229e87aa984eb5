/** Class names joined by a space; what is empty or false is left out. */
export function classNames(...names: (string | false | undefined)[]): string {
  return names.filter((name) => name !== false && name !== undefined && name !== '').join(' ');
}
