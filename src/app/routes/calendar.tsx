import { EditorPage } from '#src/features/calendars/components/editor-page.js';

export function Component() {
  return <EditorPage lockedAction={() => null} />;
}
