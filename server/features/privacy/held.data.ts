import type { Purpose } from '#shared/contracts/privacy.js';

/** A table, why it is there, and where it names people. */
export interface Held {
  purpose: Purpose;
  /** Columns that hold a person's id. */
  people: readonly string[];
  /** What of the person's own rows is theirs to have: all columns, or their names. */
  own: 'all' | readonly string[];
  /** Secrets, which open something and tell nothing. */
  secret?: readonly string[];
}

const row = (
  purpose: Purpose,
  people: readonly string[],
  own: Held['own'],
  secret: readonly string[] = [],
): Held => ({
  ...{ purpose, people, own, secret },
});

/**
 * Every table of the product. What belongs to the village is named by its id alone: whoever may see it sees it there.
 * A new table joins, or a test says so.
 */
export const HELD: Readonly<Record<string, Held>> = {
  person: row('account', ['id'], 'all', ['password_hash']),
  membership: row('membership', ['person_id'], 'all'),
  death: row('membership', ['person_id', 'noted_by'], ['died_on', 'noted_at']),
  community: row('membership', [], []),
  village_group: row('membership', [], []),
  group_member: row('membership', ['person_id'], 'all'),
  session: row('signing-in', ['person_id'], ['expires_at', 'card_id']),
  one_time_code: row('signing-in', ['person_id'], 'all', ['code_hash']),
  sign_in_card: row('signing-in', ['person_id', 'made_by', 'live_for'], ['id', 'community_id', 'made_by']),
  calendar_feed: row('signing-in', ['person_id'], 'all', ['key_hash']),
  letter: row('letters', ['person_id'], ['id', 'created_at']),
  letter_choice: row('letters', ['person_id'], 'all'),
  place: row('places', [], []),
  calendar: row('knowledge', [], []),
  calendar_version: row('knowledge', ['submitted_by'], ['id', 'calendar_id']),
  draft_contribution: row('knowledge', ['person_id'], 'all'),
  entry: row('knowledge', ['updated_by'], ['id', 'calendar_id', 'updated_at']),
  actual_date: row('knowledge', ['typed_by'], ['entry_id', 'first_day', 'last_day', 'typed_at']),
  entry_variant: row('knowledge', ['updated_by'], ['id', 'entry_id']),
  rollover: row('knowledge', ['rolled_by'], ['calendar_id', 'rolled_at']),
  open_page: row('knowledge', ['switched_by'], ['community_id', 'switched_on_at'], ['page_key']),
  no_name: row('knowledge', ['said_by'], ['entry_id', 'word', 'said_at']),
  rolled_item: row('knowledge', [], []),
  figure: row('knowledge', ['updated_by'], ['id', 'updated_at']),
  sign: row('knowledge', ['updated_by'], ['id', 'updated_at']),
  weather_notice: row('knowledge', ['written_by'], ['id', 'issued_on', 'written_at']),
  rain_day: row('knowledge', ['written_by'], 'all'),
  word_list: row('knowledge', ['updated_by'], ['community_id', 'list', 'updated_at']),
  sign_sighting: row('knowledge', ['marked_by'], 'all'),
  own_sighting: row('knowledge', ['marked_by'], 'all'),
  item_sharing: row('knowledge', ['giver_id'], 'all'),
  version_entry: row('knowledge', [], []),
  version_variant: row('knowledge', [], []),
  answer: row('review', ['elder_id', 'recorded_by'], ['id', 'entry_id', 'elder_id', 'recorded_by']),
  meeting: row('review', ['typed_by'], ['id', 'held_on', 'typed_at']),
  note: row('review', ['author_id', 'typed_by'], ['id', 'text', 'written_at', 'closed_at']),
  note_answer: row('review', ['author_id', 'typed_by'], ['id', 'text', 'written_at']),
  season_lesson: row('review', ['author_id', 'typed_by'], ['id', 'calendar_id', 'text', 'written_at']),
  season_decision: row('review', ['author_id', 'done_by'], ['id', 'calendar_id', 'kind', 'text', 'done_on']),
  signature: row('review', ['person_id'], 'all'),
  attachment: row('voices', ['added_by', 'typed_by'], ['id', 'kind', 'title', 'speaker', 'added_at']),
  attachment_part: row('voices', [], []),
  attachment_words: row('voices', ['author_id'], ['id', 'attachment_id', 'language', 'text', 'updated_at']),
  consent: row('agreement', ['giver_id', 'recorded_by'], ['id', 'item_id', 'giver_id', 'recorded_by']),
  audit_event: row(
    'records',
    ['actor_id', 'on_behalf_of'],
    ['id', 'at', 'action', 'subject_type', 'subject_id'],
  ),
  kept_read: row('records', ['person_id'], 'all'),
  write_key: row(
    'sending-again',
    ['person_id'],
    ['result_id', 'done_at', 'counts'],
    ['key_hash', 'call_hash'],
  ),
  withdrawal: row('taking-back', ['asked_by', 'done_by'], ['id', 'item_type', 'at', 'asked_by', 'done_by']),
};
