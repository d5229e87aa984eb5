import type { Sighting, Sign } from '#shared/contracts/signs.js';
import { OneSighting } from '#src/lib/one-sighting.js';
import { useSeeing } from '#src/lib/sign-queries.js';

/** A sign of the village's list that was seen on a day. */
export function SightingOf({ sign, seen }: { sign: Sign; seen: Sighting }) {
  const { takeBack } = useSeeing(sign.communityId);
  return (
    <OneSighting
      name={sign.name}
      seen={seen}
      takeBack={() => takeBack.mutateAsync({ signId: sign.id, seenId: seen.id })}
      isTakingBack={takeBack.isPending}
    />
  );
}
