const MEGABYTE = 1_000_000;

/** Bytes as a file's size is said, in megabytes: `0.1`, `12.4`, `300`. Never nothing for something. */
export function megabytes(bytes: number): string {
  const size = bytes / MEGABYTE;
  if (size >= 100) return size.toFixed(0);
  return (bytes > 0 ? Math.max(size, 0.1) : 0).toFixed(1);
}
