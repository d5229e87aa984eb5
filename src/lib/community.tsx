import { queryOptions, useQuery } from '@tanstack/react-query';
import { createContext, useCallback, useContext, useMemo, useState, type ReactNode } from 'react';
import type { Membership, Role } from '#shared/contracts/people.js';
import { placesEndpoints, type Place } from '#shared/contracts/places.js';
import { callApi } from './api-client.js';
import { keep, readKept } from './device-storage.js';
import { useSession } from './session.js';

interface CommunityChoice {
  /** Null for a person who belongs to none. */
  community: Membership | null;
  memberships: readonly Membership[];
  choose: (communityId: string) => void;
  placeId: string | null;
  choosePlace: (placeId: string) => void;
}

const Choice = createContext<CommunityChoice | null>(null);

/** Holds which village, and which of its places, is on screen. Remembered on this device, per person. */
export function CurrentCommunityProvider({ children }: { children: ReactNode }) {
  const { person, memberships } = useSession();
  const personId = person?.id ?? 'visitor';
  const [chosen, setChosen] = useState<Record<string, string>>({});

  const list = useMemo(() => memberships ?? [], [memberships]);
  const communityKey = `community.${personId}`;
  const wanted = chosen[communityKey] ?? readKept(communityKey);
  const community = list.find((each) => each.communityId === wanted) ?? list[0] ?? null;
  const placeKey = `place.${personId}.${community?.communityId ?? 'none'}`;
  const keptPlace = chosen[placeKey] ?? readKept(placeKey);
  const placeId = typeof keptPlace === 'string' ? keptPlace : null;

  const remember = useCallback((key: string, value: string) => {
    keep(key, value);
    setChosen((before) => ({ ...before, [key]: value }));
  }, []);

  const value = useMemo<CommunityChoice>(
    () => ({
      community,
      memberships: list,
      choose: (communityId) => {
        remember(communityKey, communityId);
      },
      placeId,
      choosePlace: (next) => {
        remember(placeKey, next);
      },
    }),
    [community, list, placeId, communityKey, placeKey, remember],
  );
  return <Choice value={value}>{children}</Choice>;
}

/** The village on screen (null for a person who belongs to none), all villages of the person, and the switch. */
export function useCommunityChoice(): CommunityChoice {
  const choice = useContext(Choice);
  if (choice === null) throw new Error('useCommunityChoice needs a CurrentCommunityProvider above it');
  return choice;
}

/** The village on screen. For screens below the rail, which a person without a village never reaches. */
export function useCurrentCommunity(): Membership {
  const { community } = useCommunityChoice();
  if (community === null) throw new Error('This screen needs a community');
  return community;
}

/** What the person may do in the village on screen. */
export function useRoles(): { roles: readonly Role[]; is: (...any: Role[]) => boolean } {
  const { community } = useCommunityChoice();
  const { helping } = useSession();
  return useMemo(() => {
    const isHelpedHere = helping?.shownPin === true && helping.communityId === community?.communityId;
    const roles = isHelpedHere ? helping.roles : (community?.roles ?? []);
    return { roles, is: (...any: Role[]) => any.some((role) => roles.includes(role)) };
  }, [community, helping]);
}

/** The places of a village; several screens choose among them. */
export function placesQuery(communityId: string) {
  return queryOptions({
    queryKey: ['places', communityId],
    queryFn: async ({ signal }) =>
      (await callApi(placesEndpoints.list, { params: { communityId }, signal })).items,
  });
}

/** The place on screen: the chosen one, else the village's first. `place` is null while loading or without any. */
export function useCurrentPlace(): {
  place: Place | null;
  places: readonly Place[];
  isLoading: boolean;
  choosePlace: (placeId: string) => void;
} {
  const { community, placeId, choosePlace } = useCommunityChoice();
  const communityId = community?.communityId ?? '';
  const { data, isLoading } = useQuery({ ...placesQuery(communityId), enabled: community !== null });
  const places = data ?? [];
  return {
    place: places.find((each) => each.id === placeId) ?? places[0] ?? null,
    places,
    isLoading,
    choosePlace,
  };
}
