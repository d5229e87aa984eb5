import type { EventRecord, Operation, RecordSignType } from '#shared/contracts/event-record.js';
import type { DecisionInput } from '#shared/contracts/season-reviews.js';
import type { SeenDay } from '#shared/contracts/entry-lead.js';

/** A sign for which an entry waited; without a day nobody marked it. */
interface YearsSign {
  type: RecordSignType;
  name: string;
  came?: string;
}

type Elder = 'elder' | 'elder2' | 'elder3';

/** What its record says besides the signs. */
interface YearsWork {
  operation: Operation | null;
  land: string;
  responsible: string;
  confidence: EventRecord['trust']['confidence'];
  leadDays: number;
  ifEarly: string;
  /** Month and day after which the office advises against it; left out where nothing can be hurt by it. */
  stop?: [number, number];
}

/** What became of one entry of the event list in the year before. */
export interface YearsLine {
  code: string;
  work: YearsWork;
  signs: readonly YearsSign[];
  needed: number;
  /** The first sign of the list is the one without which nothing begins. */
  hasMustHave?: boolean;
  /** When the star that leads it was seen; the lead is then the day as people saw it. */
  seen?: SeenDay;
  /** Left out where it was never done. */
  done?: { from: string; to: string | null; saidBy: string; plots: string };
  lessons: readonly { by: Elder; text: string }[];
  decision?: Pick<DecisionInput, 'kind' | 'text'> & { isDone: boolean };
}

const CLUSTER_SEEN: SeenDay = {
  date: '2026-06-08',
  by: 'Elder A-1 and a helper',
  agreedBy: 'Elder A-2',
};

/** How Upper Tazimel went through 2026. Invented, like everything here: nobody's fields, rain or birds are meant. */
export const TAZIMEL_2026: readonly YearsLine[] = [
  {
    code: 'A01',
    work: {
      operation: 'mend-walls',
      land: 'all plots',
      responsible: 'each household',
      confidence: 'strong',
      leadDays: 10,
      ifEarly: 'Begin with the walls; spread manure later.',
      stop: [6, 5],
    },
    signs: [
      { type: 'wind', name: 'Dusty west wind eases', came: '2026-05-03' },
      { type: 'cloud', name: 'First cloud build-up' },
    ],
    needed: 1,
    done: { from: '2026-05-04', to: '2026-05-29', saidBy: 'Elder A-1', plots: '' },
    lessons: [],
  },
  {
    code: 'A02',
    work: {
      operation: 'test-seed',
      land: 'seed stores',
      responsible: 'women seed-savers',
      confidence: 'strong',
      leadDays: 7,
      ifEarly: 'Test once more before the rain.',
      stop: [6, 10],
    },
    signs: [{ type: 'star-look', name: 'Cluster not seen at dusk', came: '2026-05-09' }],
    needed: 1,
    done: { from: '2026-05-25', to: '2026-05-28', saidBy: 'Elder A-2', plots: '' },
    lessons: [
      { by: 'elder2', text: 'Short millet of the lower store came up thin, too late to ask for other seed.' },
    ],
    decision: { kind: 'earlier', text: 'test the seed of the lower store first', isDone: true },
  },
  {
    code: 'A03',
    work: {
      operation: null,
      land: '',
      responsible: 'seed committee',
      confidence: 'fair',
      leadDays: 7,
      ifEarly: '',
    },
    signs: [{ type: 'star-look', name: 'Cluster seen at dawn by two people', came: '2026-06-08' }],
    needed: 1,
    seen: CLUSTER_SEEN,
    done: { from: '2026-06-11', to: null, saidBy: 'Elder A-2', plots: '' },
    lessons: [
      {
        by: 'elder',
        text: 'Looked on 4 June, not yet; cloud on the 5th. Two people should go every morning.',
      },
    ],
  },
  {
    code: 'A04',
    work: {
      operation: 'sow',
      land: 'terraces, the lower ones first',
      responsible: 'each household',
      confidence: 'fair',
      leadDays: 7,
      ifEarly: 'Sow one strip and wait.',
      stop: [7, 5],
    },
    signs: [
      { type: 'soil', name: 'Soil wet to a hand depth', came: '2026-06-20' },
      { type: 'bird', name: 'Weaver birds building', came: '2026-06-14' },
      { type: 'plant', name: 'Fig tree in new leaf' },
    ],
    needed: 2,
    hasMustHave: true,
    seen: CLUSTER_SEEN,
    done: { from: '2026-06-21', to: '2026-06-30', saidBy: 'Elder A-1', plots: 'upper terraces last' },
    lessons: [
      {
        by: 'elder',
        text: 'A shower fell on 9 June, then eleven dry days. Two households sowed after it and had to sow again.',
      },
    ],
    decision: {
      kind: 'own-words',
      text: 'Say on the board that the first shower is not the rain',
      isDone: false,
    },
  },
  {
    code: 'A06',
    work: {
      operation: 'sow',
      land: 'terraces that stand empty',
      responsible: 'each household',
      confidence: 'fair',
      leadDays: 7,
      ifEarly: 'Sow one strip and wait.',
      stop: [7, 25],
    },
    signs: [
      { type: 'soil', name: 'Soil wet to a hand depth', came: '2026-07-11' },
      { type: 'animal', name: 'Frogs calling three nights', came: '2026-07-18' },
    ],
    needed: 2,
    hasMustHave: true,
    done: { from: '2026-07-19', to: '2026-07-25', saidBy: 'Elder A-3', plots: '' },
    lessons: [
      {
        by: 'elder3',
        text: 'Cloud from 1 to 9 July. The Belt was seen on the 10th, some days after its first morning.',
      },
    ],
    decision: { kind: 'other-sign', text: 'the frogs, where the Belt stays under cloud', isDone: false },
  },
  {
    code: 'A07',
    work: {
      operation: 'weed',
      land: 'all sown plots',
      responsible: 'each household',
      confidence: 'strong',
      leadDays: 3,
      ifEarly: 'Leave it until the seedlings stand.',
      stop: [7, 31],
    },
    signs: [{ type: 'plant', name: 'Seedlings at four leaves', came: '2026-07-11' }],
    needed: 1,
    done: { from: '2026-07-12', to: '2026-07-20', saidBy: 'Elder A-2', plots: '' },
    lessons: [],
  },
  {
    code: 'A08',
    work: {
      operation: 'weed',
      land: 'all sown plots',
      responsible: 'each household',
      confidence: 'fair',
      leadDays: 3,
      ifEarly: 'Weed the best plots first.',
      stop: [8, 20],
    },
    signs: [
      { type: 'star-look', name: 'Sirius seen at dawn' },
      { type: 'plant', name: 'Crop knee high', came: '2026-07-30' },
    ],
    needed: 1,
    lessons: [
      { by: 'elder2', text: 'It rained nearly every day in August; nobody weeded a second time.' },
      { by: 'elder', text: 'On the poor plots nothing was lost by that.' },
    ],
  },
  {
    code: 'A11',
    work: {
      operation: 'harvest',
      land: 'short millet plots',
      responsible: 'each household',
      confidence: 'strong',
      leadDays: 10,
      ifEarly: 'Cut only what is dry.',
      stop: [10, 30],
    },
    signs: [
      { type: 'plant', name: 'Stem base dry', came: '2026-10-12' },
      { type: 'water', name: 'Dawn dew heavy' },
    ],
    needed: 1,
    done: { from: '2026-10-14', to: '2026-10-27', saidBy: 'Elder A-1', plots: '' },
    lessons: [],
  },
  {
    code: 'A12',
    work: {
      operation: 'harvest',
      land: 'long millet plots',
      responsible: 'each household',
      confidence: 'strong',
      leadDays: 10,
      ifEarly: 'Cut only what is dry.',
      stop: [11, 30],
    },
    signs: [{ type: 'plant', name: 'Grain hard between teeth', came: '2026-11-05' }],
    needed: 1,
    done: { from: '2026-11-23', to: '2026-11-29', saidBy: 'Elder A-1', plots: '' },
    lessons: [{ by: 'elder', text: 'Late: the youth were away at the dam. The last stacks got wet.' }],
  },
];

/** About the year as a whole, said at the meeting. */
export const YEARS_LESSON = 'The board hung in time, but too high for the children to reach the pegs.';
