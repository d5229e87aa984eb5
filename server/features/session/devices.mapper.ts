import type { Device } from '#shared/contracts/session.js';
import { z } from 'zod';
import type { SessionEntity } from '../../db/entities/session.entity.js';

const kept = z.object({
  cookie: z.object({ originalMaxAge: z.number().nullish() }),
  device: z
    .object({ beganAt: z.iso.datetime(), browser: z.string().nullable(), system: z.string().nullable() })
    .optional(),
});

/** Every use moves the end of a session on by its whole lifetime, so the end tells when it was used last. */
export function toDevice(row: SessionEntity, hereHash: string): Device {
  const { cookie, device } = kept.parse(JSON.parse(row.data));
  return {
    id: row.sidHash,
    beganAt: device?.beganAt ?? null,
    lastUsedAt: new Date(row.expiresAt.getTime() - (cookie.originalMaxAge ?? 0)).toISOString(),
    browser: device?.browser ?? null,
    system: device?.system ?? null,
    here: row.sidHash === hereHash,
  };
}
