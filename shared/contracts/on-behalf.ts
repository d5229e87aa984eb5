/**
 * What somebody may write for a person whom they help, and what that asks for. What is not here is nobody's to write in
 * another one's name: signing, compiling, people, settings.
 *
 * - `word`: the helped person need not have shown their PIN; the word itself may ask for a proof (an answer does).
 * - `pin-shown`: they typed their PIN when the helping began.
 * - `pin-again`: as before, and what is agreed is proved once more, by their PIN or their voice.
 */
export type OnBehalfRule = 'word' | 'pin-shown' | 'pin-again';

export const ON_BEHALF: Readonly<Record<string, OnBehalfRule>> = {
  putAnswer: 'word',
  putSpokenAnswer: 'word',
  addNote: 'word',
  answerNote: 'word',
  addSeasonLesson: 'word',
  createAttachment: 'word',
  addAttachmentPart: 'word',
  takeBackAnswer: 'pin-shown',
  letDifferenceStand: 'pin-shown',
  closeNote: 'pin-shown',
  reopenNote: 'pin-shown',
  saveAttachmentWords: 'pin-shown',
  removeAttachment: 'pin-shown',
  withdrawItem: 'pin-shown',
  pauseItem: 'pin-shown',
  resumeItem: 'pin-shown',
  takeNameOff: 'pin-shown',
  withdrawConsent: 'pin-shown',
  // The clip that comes with it is the proof.
  addSpokenConsent: 'pin-shown',
  changeSpokenConsent: 'pin-shown',
  addConsent: 'pin-again',
  changeConsent: 'pin-again',
};

/** Where the helped person's PIN comes with a call that asks for it once more. */
export const ELDER_PIN_HEADER = 'X-Elder-Pin';
