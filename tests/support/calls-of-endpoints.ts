import { randomUUID } from 'node:crypto';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { variantInput } from '#tests/support/variant-api.js';
import { noteInput } from '#tests/support/notes-api.js';
import type { Endpoint } from '#shared/contracts/endpoint.js';
import type { Community, Role } from '#shared/contracts/people.js';
import type { Place } from '#shared/contracts/places.js';
import { DEMO_PASSWORD } from '#server/features/demo/demo-villages.data.js';
import { entryInput, says } from '#tests/support/calendar-api.js';
import { asked, spokenContent } from '#tests/support/consent-api.js';
import { attachmentInput } from '#tests/support/attachment-api.js';
import { noticeInput } from '#tests/support/weather-api.js';
import { signInput } from '#tests/support/sign-api.js';
import { figureInput } from '#tests/support/figure-api.js';

/** Ids of one village that really exist, so that a call that is let in reaches the service. */
export interface Village {
  community: Community;
  place: Place;
  calendarId: string;
  /** A draft that was rolled over and never submitted. */
  rolledId: string;
  /** A task of that draft. */
  taskId: string;
  entryId: string;
  /** In review, and kept by everybody who calls here. */
  ownEntryId: string;
  personId: string;
  figureId: string;
  signId: string;
  /** A sighting of somebody who calls nothing here. */
  seenId: string;
  /** A sign that the calling elder put on the list. */
  elderSignId: string;
  /** A sign in the entry's own words, and a day on which it was seen, marked by somebody who calls nothing here. */
  ownId: string;
  ownSeenId: string;
  /** A picture of the figure, added by somebody who calls nothing here. */
  attachmentId: string;
  groupId: string;
  feedKey: string;
  openKey: string;
  variantId: string;
  /** A note of somebody who calls nothing here. */
  noteId: string;
  withdrawalId: string;
  /** One about each who calls, for it is theirs to read; visitors ask for the officer's. */
  consentIds: Readonly<Record<Role, string>>;
  elderId: string;
  /** A published version, which everybody of the village sees, and one that is in review. */
  publishedNumber: number;
  reviewedNumber: number;
}

const OF_ITS_PEOPLE = new Set(['putOwnAnswer', 'takeBackOwnAnswer', 'letOwnDifferenceStand']);

const OF_NEXT_YEAR = new Set(['readRollover', 'listSeasonTasks', 'tickSeasonTask', 'untickSeasonTask']);
/** What one person took out of the list is not there for the next one. */
const CHANGES_A_SIGN = new Set(['updateSign', 'removeSign', 'restoreSign']);

export function paramsOf(endpoint: Endpoint, role: Role | null, village: Village): Record<string, string> {
  const reviewed = new Set([
    'askChanges',
    'publishVersion',
    'listAnswers',
    'putAnswer',
    'putSpokenAnswer',
    'typeInMeeting',
    'printReadBack',
    'takeBackAnswer',
    'letDifferenceStand',
    'signVersion',
    'readOwnEntries',
    ...OF_ITS_PEOPLE,
  ]);
  return {
    communityId: village.community.id,
    placeId: village.place.id,
    calendarId: OF_NEXT_YEAR.has(endpoint.id) ? village.rolledId : village.calendarId,
    taskId: village.taskId,
    lessonId: randomUUID(),
    decisionId: randomUUID(),
    entryId: OF_ITS_PEOPLE.has(endpoint.id) ? village.ownEntryId : village.entryId,
    personId: village.personId,
    figureId: village.figureId,
    signId: role === 'elder' && CHANGES_A_SIGN.has(endpoint.id) ? village.elderSignId : village.signId,
    seenId: endpoint.id === 'takeBackOwnSignSeen' ? village.ownSeenId : village.seenId,
    ownId: village.ownId,
    noticeId: randomUUID(),
    rainId: randomUUID(),
    list: 'kinds',
    attachmentId: village.attachmentId,
    part: '1',
    groupId: village.groupId,
    variantId: village.variantId,
    noteId: village.noteId,
    withdrawalId: village.withdrawalId,
    consentId: village.consentIds[role ?? 'officer'],
    itemType: 'entry',
    itemId: endpoint.id === 'removeSound' ? village.attachmentId : village.entryId,
    markerKey: 'pleiades',
    feedId: randomUUID(),
    noNameId: randomUUID(),
    deviceId: '0'.repeat(64),
    number: String(reviewed.has(endpoint.id) ? village.reviewedNumber : village.publishedNumber),
  };
}

export function queryOf(
  endpoint: Endpoint,
  { publishedNumber, figureId, feedKey, openKey }: Village,
): string {
  const queries: Record<string, string> = {
    findTimeZone: '?latitudeDeg=12&longitudeDeg=39',
    readFeed: `?key=${feedKey}`,
    readOpenPage: `?key=${openKey}`,
    listStars: '?year=2027',
    exportStarsCsv: '?year=2027',
    readStar: '?year=2027',
    listSkylineEffects: '?year=2027',
    findMarkers: '?year=2027&from=06-10',
    readDrift: '?from=1500&to=2027',
    readLongLook: '?from=2027&years=2',
    exportDriftCsv: '?from=1500&to=2027',
    readLook: '?marker=pleiades&date=2027-06-10',
    printLook: '?marker=pleiades&date=2027-06-10',
    listAttachments: `?subjectType=figure&subjectId=${figureId}`,
    compareVersions: `?from=${publishedNumber}&to=${publishedNumber}`,
  };
  return queries[endpoint.id] ?? '';
}

/** Well-formed, so that only the gate can stop them; an old version number keeps most from changing anything. */
export function bodyOf(endpoint: Endpoint, role: Role | null, village: Village): object {
  const { id: _id, version: _version, ...settings } = village.community;
  const { id: _placeId, communityId: _communityId, version: _placeVersion, ...place } = village.place;
  const stale = { version: 999 };
  const speaksForAnElder = role === 'officer' || role === 'steward';
  const bodies: Record<string, () => object> = {
    signIn: () => ({ email: 'observer@dawnpeg.example', password: DEMO_PASSWORD }),
    changePassword: () => ({ currentPassword: 'not mine', newPassword: 'never comes to be' }),
    openCard: () => ({ code: 'AAABBBCCCDDDEEEFFF' }),
    chooseCardPin: () => ({ code: 'AAABBBCCCDDDEEEFFF', pin: '4711' }),
    signInByCard: () => ({ code: 'AAABBBCCCDDDEEEFFF', pin: '4711' }),
    printCard: () => ({ code: 'AAABBBCCCDDDEEEFFF', name: '', size: 'a7' }),
    redeemCode: () => ({ email: 'a@example.org', code: 'ABCD-EFGH-JKMN', newPassword: 'never comes to be' }),
    resetPassword: () => ({
      token: `${village.personId}.${'0'.repeat(64)}`,
      newPassword: 'never comes to be',
    }),
    leaveForGood: () => ({ password: 'not mine', takeBackGiven: false }),
    askForResetLetter: () => ({ email: 'a@example.org' }),
    saveLetterChoice: () => ({
      channel: 'none',
      rhythm: 'each',
      visitMe: false,
      quietHours: null,
      ...stale,
    }),
    setUpFirstSteward: () => ({
      token: 'there is no such token',
      email: 'a@example.org',
      displayName: 'A',
      newPassword: 'never comes to be',
      communityName: 'Nowhere',
    }),
    updateCommunity: () => ({ ...settings, ...stale }),
    addPerson: () => ({ email: 'new@example.org', displayName: 'New', roles: ['observer'] }),
    updatePerson: () => ({ roles: ['observer'], ...stale }),
    createPlace: () => place,
    updatePlace: () => ({ ...place, ...stale }),
    createFigure: () => figureInput(),
    addNotice: () => noticeInput(),
    saveWordList: () => ({ items: [], ...stale }),
    addRain: () => ({ day: '2026-11-29', mm: 3, words: '' }),
    addSign: () => signInput(),
    updateSign: () => ({ ...signInput(), ...stale }),
    markOwnSignSeen: () => ({ day: '2026-11-29', who: 'Tirel' }),
    markSignSeen: () => ({ day: '2026-11-29', who: 'Tirel' }),
    updateFigure: () => ({ ...figureInput(), ...stale }),
    createAttachment: () => attachmentInput({ subjectId: village.figureId }),
    addAttachmentPart: () => ({ part: 1, seconds: 2 }),
    saveAttachmentWords: () => ({
      kind: 'words',
      language: 'en',
      text: 'As told',
      checkedBySpeaker: false,
      ...stale,
    }),
    previewSkylineEffects: () => ({ place, year: 2027 }),
    compareMarkerYears: () => ({
      years: [2027],
      markers: [{ markerKey: 'pleiades', phenomenon: 'heliacal-rising' }],
    }),
    computeSkyMarker: () => ({ year: 2027, spec: { kind: 'zenith-sun' } }),
    createCalendar: () => ({ placeId: village.place.id, year: 2031 }),
    // An elder writes what is kept; the village's entries are the officer's.
    addEntry: () => entryInput(role === 'elder' ? { sharingLevel: 'elders' } : {}),
    updateEntry: () => ({ content: entryInput(), ...stale }),
    addSeasonLesson: () => ({ entryId: village.entryId, text: 'Begin at the stream' }),
    addSeasonDecision: () => ({ entryId: null, kind: 'own-words', text: 'Meet earlier' }),
    putActualDays: () => ({ from: '2027-06-24', to: null, saidBy: 'Elder A-1', plots: '' }),
    importCalendarFile: () => ({ dryRun: true }),
    importTable: () => ({
      ...{ dryRun: true, dayOrder: null, natureSigns: [] },
      lines: [{ line: 2, cells: { titleOfficer: 'Mend', kind: 'farm', bestFrom: '06-07' } }],
    }),
    // To itself, which is refused once somebody may copy at all.
    copyCalendar: () => ({ dryRun: true, toCalendarId: village.calendarId }),
    sayNoName: () => ({ entryId: village.entryId, word: 'caution', key: '0'.repeat(64) }),
    switchOpenPageOn: () => ({ placeShown: 'name' }),
    addVariant: () => variantInput(),
    updateVariant: () => ({ content: variantInput(), ...stale }),
    addNote: () => noteInput({ subjectType: 'figure', subjectId: village.figureId }),
    answerNote: () => ({ text: 'So it is told here, too' }),
    addGroup: () => ({ name: `Menders ${role ?? ''}`, memberIds: [village.elderId] }),
    updateGroup: () => ({ name: 'Menders', memberIds: [village.elderId], ...stale }),
    // Nobody of these gave it or is asked for it: the thing stays.
    withdrawItem: () => ({ leavesTrace: true, askedById: village.place.id }),
    nameHeir: () => ({ name: 'Nobody', personId: village.elderId }),
    noteDeath: () => ({ diedOn: '2026-11-01', removesForGood: false }),
    pauseItem: () => ({ askedById: village.place.id }),
    removeSound: () => ({ askedById: village.place.id }),
    // Without a card there is no PIN: nobody begins to be helped in the middle of this.
    startHelping: () => ({
      personId: village.elderId,
      card: { code: 'ABC-DEF-GHJ-KLM-NPQ-RST', pin: '9025' },
    }),
    addConsent: () => ({ ...asked(), itemType: 'entry', itemId: village.entryId }),
    changeConsent: () => ({ content: asked(), ...stale }),
    withdrawConsent: () => stale,
    addSpokenConsent: () => ({ ...spokenContent(), itemType: 'entry', itemId: village.entryId }),
    changeSpokenConsent: () => ({ content: spokenContent(), ...stale }),
    changeSharing: () => ({ sharing: { level: 'village', ...PLAIN_DETAILS }, ...stale }),
    reorderEntries: () => ({ entryIds: [village.entryId] }),
    askChanges: () => ({ reason: 'taken-back', note: '' }),
    recallVersion: () => ({ note: 'A wrong date' }),
    putAnswer: () => (speaksForAnElder ? says({ onBehalfOf: village.elderId, witness: 'Tirel' }) : says()),
    putSpokenAnswer: () => ({ answer: 'agree', note: '', onBehalfOf: village.elderId }),
    putOwnAnswer: () => ({ answer: 'agree', note: '' }),
    typeInMeeting: () => ({
      heldOn: '2026-12-01',
      witness: 'Tirel',
      answers: [{ elderId: village.elderId, entryId: village.entryId, answer: 'agree', note: '' }],
    }),
    signVersion: () => ({ role: role === 'steward' ? 'steward' : 'elder' }),
  };
  const make = bodies[endpoint.id];
  if (!make) throw new Error(`Say in calls-of-endpoints.ts what ${endpoint.id} is sent.`);
  return make();
}
