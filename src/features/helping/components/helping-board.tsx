import { useQuery } from '@tanstack/react-query';
import { HeartHandshake } from 'lucide-react';
import { useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { cardCode, PIN_MAX } from '#shared/contracts/cards.js';
import { HELPING_MINUTES } from '#shared/contracts/helping.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useCommunityChoice, useRoles } from '#src/lib/community.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSession } from '#src/lib/session.js';
import { Button } from '#src/ui/button.js';
import { SelectField, TextField } from '#src/ui/field.js';
import { Board } from '#src/ui/surfaces.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { helpableQuery, useStartHelping } from '../api/helping-api.js';

/** Reads a card by the camera and hands over its letters. */
type Scan = (onFound: (code: string) => void) => ReactNode;

/** Begin to type for an elder: whom, their card and their PIN. */
export function HelpingBoard({ scan }: { scan: Scan }) {
  const { community } = useCommunityChoice();
  const { helping } = useSession();
  if (community === null || helping !== undefined) return null;
  return <StartForm communityId={community.communityId} scan={scan} />;
}

function StartForm({ communityId, scan }: { communityId: string; scan: Scan }) {
  const { t } = useTranslation('helping');
  const words = useProblemWords();
  const navigate = useNavigate();
  const { is } = useRoles();
  const helpable = useQuery(helpableQuery(communityId));
  const start = useStartHelping(communityId);
  const [personId, setPersonId] = useState('');
  const [code, setCode] = useState('');
  const [pin, setPin] = useState('');
  const [problem, setProblem] = useState<{ who?: string; code?: string; pin?: string }>({});
  const mayWithout = is('officer', 'elder', 'steward');

  const begin = async () => {
    if (personId === '') {
      setProblem({ who: t('choose') });
      return;
    }
    const isShown = !mayWithout || code !== '' || pin !== '';
    if (isShown && !cardCode.safeParse(code).success) {
      setProblem({ code: words.field('card-code-length') });
      return;
    }
    if (isShown && pin === '') {
      setProblem({ pin: words.field('pin-digits') });
      return;
    }
    try {
      await start.mutateAsync({ personId, card: isShown ? { code, pin } : null });
      await navigate(paths.today());
    } catch (cause) {
      const [wrong] = cause instanceof ApiProblem ? cause.errors : [];
      const sentence = wrong === undefined ? words.problem(cause) : words.field(wrong.code);
      setProblem(wrong?.field === 'card.code' ? { code: sentence } : { pin: sentence });
    }
    setPin('');
  };
  return (
    <Board title={t('title')}>
      <form
        className="grid gap-4"
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          void begin();
        }}
      >
        <p>{t('lead', { count: HELPING_MINUTES })}</p>
        {helpable.isPending && <Skeleton lines={2} />}
        {helpable.error !== null && <TroubleNote sentence={words.problem(helpable.error)} />}
        {helpable.isSuccess && (
          <SelectField
            label={t('whom')}
            value={personId}
            problem={problem.who}
            onChange={(event) => {
              setPersonId(event.currentTarget.value);
              setProblem({});
            }}
          >
            <option value="">–</option>
            {helpable.data.map((each) => (
              <option key={each.personId} value={each.personId}>
                {each.displayName}
              </option>
            ))}
          </SelectField>
        )}
        {scan((found) => {
          setCode(found);
          setProblem({});
        })}
        <TextField
          label={t('card')}
          hint={t('cardHint')}
          autoComplete="off"
          autoCapitalize="characters"
          spellCheck={false}
          value={code}
          problem={problem.code}
          onChange={(event) => {
            setCode(event.currentTarget.value);
            setProblem({});
          }}
        />
        <TextField
          label={t('pin')}
          hint={mayWithout ? t('pinMay') : t('pinMust')}
          type="password"
          inputMode="numeric"
          autoComplete="off"
          maxLength={PIN_MAX}
          value={pin}
          problem={problem.pin}
          onChange={(event) => {
            setPin(event.currentTarget.value.replace(/\D/gu, ''));
            setProblem({});
          }}
        />
        <Button type="submit" busy={start.isPending} icon={<HeartHandshake aria-hidden size={22} />}>
          {t('begin')}
        </Button>
      </form>
    </Board>
  );
}
