import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { SharingDetails, SharingLevel } from '#shared/contracts/sharing.js';
import { useCommunityChoice } from './community.js';
import { useDateWords } from './date-words.js';
import { groupsQuery } from './sharing-queries.js';

/** Any year without a 29 February. */
const PLAIN_YEAR = 2027;

/** Who may see a thing, in a few words: "Group: Weavers", "Elders, told from 1 August to 31 August". */
export function useSharingWords(): (level: SharingLevel, details?: SharingDetails) => string {
  const { t } = useTranslation('sharing');
  const dates = useDateWords();
  const communityId = useCommunityChoice().community?.communityId ?? '';
  const { data: groups } = useQuery({ ...groupsQuery(communityId), enabled: communityId !== '' });
  return useMemo(
    () => (level, details) => {
      const group = groups?.find(({ id }) => id === details?.groupId);
      const name =
        level === 'group' && group ? t('panel.group', { name: group.name }) : t(`level.${level}.name`);
      const season = details?.tellingSeason ?? null;
      if (season === null) return name;
      const day = (date: { month: number; day: number }) => dates.day({ year: PLAIN_YEAR, ...date });
      return `${name}, ${t('summary.season', { from: day(season.from), to: day(season.to) })}`;
    },
    [t, dates, groups],
  );
}
