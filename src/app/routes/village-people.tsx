import { AfterDeathButton } from '#src/features/after-death/components/after-death-button.js';
import { PeoplePage } from '#src/features/people/components/people-page.js';
import { useCurrentCommunity } from '#src/lib/community.js';

/** Who belongs to the village; the steward notes there, too, that somebody has died. */
export function Component() {
  const { communityId } = useCurrentCommunity();
  return (
    <PeoplePage
      quietly={({ id, displayName }, people) => (
        <AfterDeathButton communityId={communityId} personId={id} name={displayName} people={people} />
      )}
    />
  );
}
