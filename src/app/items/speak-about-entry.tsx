import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { VoiceRecorder } from '#src/features/attachments/components/voice-recorder.js';
import { useKeptRecordings } from '#src/features/attachments/model/use-kept-recordings.js';
import { calendarQuery } from '#src/lib/calendar-queries.js';
import { useActing } from '#src/lib/session.js';

/** A voice about an entry of a version, for whoever answers by speaking. One that was begun here goes on. */
export function SpeakAboutEntry({
  entryId,
  onKept,
  onClose,
}: {
  entryId: string;
  onKept: (recordingId: string) => void;
  onClose: () => void;
}) {
  const { calendarId = '' } = useParams();
  const { data: calendar } = useQuery(calendarQuery(calendarId));
  const personId = useActing().id;
  const subject = { subjectType: 'entry', subjectId: entryId } as const;
  const { unsent, isKnown } = useKeptRecordings(personId, subject);
  if (calendar === undefined || !isKnown) return null;
  return (
    <VoiceRecorder
      communityId={calendar.communityId}
      subject={subject}
      found={unsent[0] ?? null}
      onKept={({ id }) => {
        onKept(id);
      }}
      onDone={onClose}
    />
  );
}
