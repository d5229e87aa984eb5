const ENDINGS: Readonly<Record<string, string>> = {
  'image/jpeg': 'jpg',
  'audio/webm': 'webm',
  'audio/mp4': 'm4a',
  'audio/ogg': 'ogg',
};

/** How the name of a kept file ends, without the dot. */
export function endingOf(contentType: string): string {
  return ENDINGS[contentType] ?? 'bin';
}
