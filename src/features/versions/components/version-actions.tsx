import { useNavigate } from 'react-router-dom';
import type { Version } from '#shared/contracts/versions.js';
import { paths } from '#src/lib/paths.js';
import { Publish } from './publish.js';
import { Recall } from './recall.js';
import { TakeBack } from './take-back.js';

/** What the officer may do with this version now; nothing where there is nothing. */
export function VersionActions({ version }: { version: Version }) {
  const navigate = useNavigate();
  const { calendarId, number, state, label, may } = version;
  return (
    <>
      {may.publish && <Publish calendarId={calendarId} number={number} />}
      {may.askChanges && (
        <TakeBack
          calendarId={calendarId}
          number={number}
          state={state}
          onDone={() => void navigate(paths.calendar(calendarId))}
        />
      )}
      {may.recall && label !== null && <Recall calendarId={calendarId} number={number} label={label} />}
    </>
  );
}
