import { Page } from '#src/ui/page.js';
import { Skeleton } from '#src/ui/waiting.js';

/** While the first screen's code and the session are on their way. */
export function FirstWait() {
  return (
    <Page>
      <div className="pt-8">
        <Skeleton lines={4} />
      </div>
    </Page>
  );
}
