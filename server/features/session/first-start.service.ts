import { addDays } from 'date-fns';
import { randomBytes, randomUUID } from 'node:crypto';
import { IsNull, type DataSource } from 'typeorm';
import { OneTimeCodeEntity } from '../../db/entities/one-time-code.entity.js';
import { PersonEntity } from '../../db/entities/person.entity.js';
import type { Clock } from '../../http/context.js';
import { codeHash } from './one-time-codes.service.js';

const LINK_LIFETIME_DAYS = 7;

/**
 * The secret of the one-time link with which the first steward founds the first community. Null once anybody
 * has an account. Each start makes a new one and ends the one before: only a hash is stored.
 */
export async function firstStewardToken(dataSource: DataSource, clock: Clock): Promise<string | null> {
  if ((await dataSource.getRepository(PersonEntity).count()) > 0) return null;
  // Upper-case hex survives the folding of letters that codes go through.
  const token = randomBytes(24).toString('hex').toUpperCase();
  const now = clock.now();
  const codes = dataSource.getRepository(OneTimeCodeEntity);
  await codes.update({ purpose: 'first-steward', usedAt: IsNull() }, { usedAt: now });
  await codes.insert({
    id: randomUUID(),
    purpose: 'first-steward',
    personId: null,
    codeHash: codeHash(token),
    failedTries: 0,
    expiresAt: addDays(now, LINK_LIFETIME_DAYS),
    usedAt: null,
  });
  return token;
}
