import type { ConsentInput } from '#shared/contracts/consents.js';

/** The entry that Elder A-3 keeps for the elders. */
export const WITHHELD_CODE = 'A09';

type Said = Omit<ConsentInput, 'itemType' | 'itemId' | 'giverId' | 'giverName' | 'askedOn' | 'reviewBy'>;

const ASKED: Said = {
  answer: 'given',
  givenAs: 'person',
  spokeFor: '',
  askedWhere: 'Upper Tazimel',
  language: null,
  askedHow: ['spoken'],
  explainedBy: 'Officer Beyno',
  explanation: 'Card 1',
  proof: { kind: 'witness', witness: 'Steward Ostrel', attachmentId: null },
  uses: [],
  naming: 'named',
  conditions: '',
  benefits: '',
  until: null,
  afterDeath: null,
  passTo: '',
  mayWithdraw: [],
};

/** All that a village does with what is open, and the page that anybody can read. */
const OPEN_TO_ALL: Said = {
  ...ASKED,
  uses: ['keep', 'show', 'print', 'recording', 'feed', 'open-page', 'message'],
  afterDeath: 'keep',
};

/** What three givers of the demo agreed to; invented, like everything here. Days count from the asking. */
export const TAZIMEL_CONSENTS: readonly {
  code: string;
  by: 'elder' | 'elder2' | 'elder3';
  reviewInDays: number;
  said: Said;
}[] = [
  { code: 'A01', by: 'elder', reviewInDays: 365, said: OPEN_TO_ALL },
  { code: 'A02', by: 'elder2', reviewInDays: 365, said: OPEN_TO_ALL },
  { code: 'A04', by: 'elder', reviewInDays: 365, said: OPEN_TO_ALL },
  { code: 'A12', by: 'elder', reviewInDays: 365, said: OPEN_TO_ALL },
  {
    code: 'A03',
    by: 'elder2',
    // Soon to be asked again, so that the list of what is due shows one.
    reviewInDays: 40,
    said: {
      ...ASKED,
      answer: 'given-with-conditions',
      uses: ['keep', 'show', 'print'],
      conditions: 'Only for this village’s board. Ask again before each lending.',
      benefits: 'A printed board for the seed committee',
      mayWithdraw: ['elders'],
    },
  },
  {
    code: WITHHELD_CODE,
    by: 'elder3',
    reviewInDays: 365,
    said: {
      ...ASKED,
      explainedBy: '',
      explanation: '',
      proof: null,
      uses: ['keep', 'show'],
      naming: 'role',
      afterDeath: 'tighten',
    },
  },
];
