import { createHmac } from 'node:crypto';
import { codeOf } from '../session/one-time-codes.service.js';

/**
 * Codes and links of letters are computed from the letter's id and the server's secret, so that the outbox keeps
 * none of them and every attempt at the same letter carries the same one.
 */
export function invitationCode(serverSecret: string, letterId: string): string {
  return codeOf(BigInt(`0x${digest(serverSecret, 'invitation', letterId)}`));
}

/** `<letter id>.<secret>`; the id finds the row, the secret opens it. */
export function resetToken(serverSecret: string, letterId: string): string {
  return `${letterId}.${digest(serverSecret, 'password-reset', letterId).toUpperCase()}`;
}

function digest(serverSecret: string, use: string, letterId: string): string {
  return createHmac('sha256', serverSecret).update(`letters ${use} ${letterId}`).digest('hex');
}
