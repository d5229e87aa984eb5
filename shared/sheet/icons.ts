/**
 * The drawn signs of the boards, one source for paper and screens.
 *
 * Drawn for this product on a square of 48 units, y downwards. Black only: every slit and every line is at
 * least 1.9 units wide, which is 0.4 mm when the sign is 10 mm high, so that it survives a copier.
 *
 * `fill` is one path filled by the even-odd rule (an inner outline is a hole); `strokes` are lines with
 * round ends and joins in the same ink. Either may be empty.
 */
export const ICON_BOX_UNITS = 48;

export interface IconStroke {
  readonly d: string;
  /** In units of the 48-unit square. */
  readonly width: number;
}

export interface IconDrawing {
  readonly fill: string;
  readonly strokes: readonly IconStroke[];
}

/** A full circle as path data, for discs and round holes inside a compound path. */
function disc(cx: number, cy: number, r: number): string {
  return `M${cx - r} ${cy}A${r} ${r} 0 1 0 ${cx + r} ${cy}A${r} ${r} 0 1 0 ${cx - r} ${cy}Z`;
}

/** One petal of a flower whose heart is at (cx, cy), turned clockwise from the top. */
function petal(cx: number, cy: number, turnDeg: number): string {
  const turn = (turnDeg * Math.PI) / 180;
  const at = (r: number): string =>
    `${(cx + r * Math.sin(turn)).toFixed(2)} ${(cy - r * Math.cos(turn)).toFixed(2)}`;
  return `M${at(5)}A4.3 4.7 ${turnDeg} 1 1 ${at(14.4)}A4.3 4.7 ${turnDeg} 1 1 ${at(5)}Z`;
}

function icon(fill: string, ...strokes: IconStroke[]): IconDrawing {
  return { fill, strokes };
}

function stroke(d: string, width: number): IconStroke {
  return { d, width };
}

const drawings = {
  /** Three seeds with their seams. */
  seed: icon(
    'M24 3C32.4 8.4 32.6 18.6 24 24C15.4 18.6 15.6 8.4 24 3ZM23 8.6V18.4H25V8.6Z' +
      'M3.4 26C12.4 23.4 20.8 29.2 20.6 39.4C11.8 41.6 3.6 36 3.4 26ZM8 30.8L14.6 37L16 35.6L9.4 29.4Z' +
      'M44.6 26C35.6 23.4 27.2 29.2 27.4 39.4C36.2 41.6 44.4 36 44.6 26ZM40 30.8L33.4 37L32 35.6L38.6 29.4Z',
    stroke('M11 45H37', 2.6),
  ),
  /** A seed under the ground and its first two leaves. */
  sow: icon(
    'M24 31.5C30.5 33.5 31.5 40.5 24 45.5C16.5 40.5 17.5 33.5 24 31.5Z' +
      'M22.8 18.5C15.5 19.5 8.5 15.5 7 5.5C16 4.5 23.5 9.5 22.8 18.5Z' +
      'M25.4 13.5C26 7.5 32 2.8 40.5 4C40.5 12.5 33.5 17.8 25.4 13.5Z',
    stroke('M24 31C24 24 23.6 19 25 13', 2.6),
    stroke('M4 28H17.5M30.5 28H44', 3.2),
  ),
  /** A digging hoe with a bent neck, and the clods it turns. */
  hoe: icon(
    'M9.5 17.5L18.8 11L25.6 20.5C22.6 24.8 17.6 30 10.6 34.6C6.8 29.6 6.2 23 9.5 17.5Z' +
      'M25 41.5L29.5 35L33 38L36.8 33.4L43.5 41.5Z',
    stroke('M15 13.5C19 7 25 5.6 29 10.6L42.5 29', 3.6),
    stroke('M4 44.2H44', 2.8),
  ),
  /** A young plant set in its mound. */
  plant: icon(
    'M4 44.6C6.4 36.4 14 31.4 24 31.4C34 31.4 41.6 36.4 44 44.6ZM13 39.6H18.4V41.8H13ZM30 38.4H35.4V40.6H30Z' +
      'M22.6 15.8C16.4 16.2 11.2 12.4 10.4 4.2C18 4 23 8.4 22.6 15.8Z' +
      'M25.4 15.8C31.6 16.2 36.8 12.4 37.6 4.2C30 4 25 8.4 25.4 15.8Z' +
      'M22.4 26C16.6 27 10.4 24.6 8.2 18C15 16.2 21 19.4 22.4 26Z' +
      'M25.6 26C31.4 27 37.6 24.6 39.8 18C33 16.2 27 19.4 25.6 26Z',
    stroke('M24 15V29.4', 2.6),
  ),
  /** A fork standing in a heap. */
  manure: icon(
    'M3.6 44.6C5 36.6 9.6 34.8 13.6 35.2C15.6 31.6 19 30.2 24 30.2C29 30.2 32.4 31.6 34.4 35.2C38.4 34.8 43 36.6 44.4 44.6Z',
    stroke('M24 3.6V28', 3),
    stroke('M15.4 27.4V19.4C15.4 16.4 17 14.8 20 14.8H28C31 14.8 32.6 16.4 32.6 19.4V27.4', 2.8),
    stroke('M20.4 3.6H27.6', 3),
  ),
  /** A weed drawn out of the ground with its roots. */
  weed: icon(
    'M24 19.5C18.2 16.6 16.4 9.4 24 2.5C31.6 9.4 29.8 16.6 24 19.5Z' +
      'M21.4 24C14.6 26 8 22.6 5.4 14.4C13.6 12.6 19.8 16.2 21.4 24Z' +
      'M26.6 24C33.4 26 40 22.6 42.6 14.4C34.4 12.6 28.2 16.2 26.6 24Z',
    stroke('M24 19V32', 3),
    stroke('M24 31.5C23 36 18.5 36 16.5 40M24 31.5V43M24 31.5C25 36 29.5 36 31.5 40', 2.2),
    stroke('M4 35.5H11M37 35.5H44', 3),
  ),
  /** A ripe ear and the sickle. */
  harvest: icon(
    'M13.5 3C16.6 6 16.6 9.8 13.5 12.4C10.4 9.8 10.4 6 13.5 3Z' +
      'M11.6 20.4C6.8 19.6 4.2 16.2 4.4 11.8C8.8 12.6 11.6 15.6 11.6 20.4Z' +
      'M15.4 20.4C20.2 19.6 22.8 16.2 22.6 11.8C18.2 12.6 15.4 15.6 15.4 20.4Z' +
      'M11.6 30C6.8 29.2 4.2 25.8 4.4 21.4C8.8 22.2 11.6 25.2 11.6 30Z' +
      'M15.4 30C20.2 29.2 22.8 25.8 22.6 21.4C18.2 22.2 15.4 25.2 15.4 30Z' +
      'M27 5.4C38.6 6.2 45.6 14.4 44 24.4C43 30.8 38.6 35.2 33.4 36.2L31.2 32.4C36.2 30.6 39.2 26.8 39.2 21.4C39.2 14 34.6 8.6 27 5.4Z',
    stroke('M13.5 13.5V45', 2.4),
    stroke('M31.6 35.6L25.6 44.6', 4.4),
  ),
  /** The head of an ox, seen from the front. */
  herd: icon(
    'M16.5 15.5H31.5C33.4 20.2 32.4 26 31 31L30.4 40.5C29.6 44.4 18.4 44.4 17.6 40.5L17 31C15.6 26 14.6 20.2 16.5 15.5Z' +
      disc(19.9, 24.6, 1.7) +
      disc(28.1, 24.6, 1.7) +
      disc(21.3, 38.6, 1.25) +
      disc(26.7, 38.6, 1.25) +
      'M13.4 18.6C9.4 16.6 5.6 17.4 3.4 20.4C6.2 24 10.2 24.8 13.2 23.2Z' +
      'M34.6 18.6C38.6 16.6 42.4 17.4 44.6 20.4C41.8 24 37.8 24.8 34.8 23.2Z',
    stroke('M17.4 13.4C11 14 7.4 10.4 8.2 4.4M30.6 13.4C37 14 40.6 10.4 39.8 4.4', 3.4),
  ),
  /** A cloud and its first heavy drops. */
  rain: icon(
    'M13.4 28.6C7.4 28.6 4 24.8 4 20.4C4 16 7.4 12.8 11.6 12.6C12.8 7.2 17.4 3.6 22.8 3.6C28 3.6 32.2 6.6 34 11.2C39.8 10.8 44 14.8 44 19.8C44 25 40 28.6 35 28.6Z' +
      'M12.6 32.4C15.4 36.4 16 38.2 16 39.4A3.4 3.4 0 0 1 9.2 39.4C9.2 38.2 9.8 36.4 12.6 32.4Z' +
      'M24 35.6C26.8 39.6 27.4 41.4 27.4 42.6A3.4 3.4 0 0 1 20.6 42.6C20.6 41.4 21.2 39.6 24 35.6Z' +
      'M35.4 32.4C38.2 36.4 38.8 38.2 38.8 39.4A3.4 3.4 0 0 1 32 39.4C32 38.2 32.6 36.4 35.4 32.4Z',
  ),
  /** A small grain-eater on a stalk. */
  bird: icon(
    'M46 14.4L39.6 12.6C37.8 8.6 33.2 7 29.2 8.6C25.6 10 24.6 13.4 22.4 16.4L2.6 32.4L10.8 32L13 36.4L19 32.6C28.6 34.8 37.6 29.8 38.6 20.4L39.2 17.2Z' +
      disc(33.8, 13.4, 1.7) +
      'M30.6 19.8C30 25.6 25.4 28.4 18.4 27.6C23.4 26.2 26 23.6 27.4 18.8Z',
    stroke('M24.6 34.4V42M31 32.8V42', 2.2),
    stroke('M12 43.2H42', 2.8),
  ),
  /** Five petals around their heart, two leaves. */
  blossom: icon(
    disc(24, 17, 3) +
      petal(24, 17, 0) +
      petal(24, 17, 72) +
      petal(24, 17, 144) +
      petal(24, 17, 216) +
      petal(24, 17, 288) +
      'M22.6 45C16.6 45.4 11.8 42.8 10.2 36.6C16.6 35.8 21.4 38.8 22.6 45Z' +
      'M25.4 45C31.4 45.4 36.2 42.8 37.8 36.6C31.4 35.8 26.6 38.8 25.4 45Z',
    stroke('M24 32V45', 2.6),
  ),
  /** A fish heading left. */
  fish: icon(
    'M2.6 24.4C7.6 15 17.4 11.6 26.2 15.2C30 16.8 32.6 19.2 34.8 21.6L45.6 13.4C43.6 20.4 43.6 28 45.6 35.2L34.8 26.8C32.6 29.4 30 31.8 26.2 33.4C17.4 37 7.6 33.8 2.6 24.4Z' +
      disc(10.8, 22.4, 1.8) +
      'M16.2 17.4C19.8 21.8 19.8 27 16.2 31.4L14.2 30.4C17 26.4 17 22.4 14.2 18.4Z',
  ),
  /** A flame over two logs. */
  fire: icon(
    'M24.6 2.4C26.6 9.6 36.4 14.6 35.6 24.6C35 31.2 30.2 34.6 24 34.6C17.4 34.6 12.4 30.8 12.4 24.4C12.4 20 14.6 17.2 16.4 14.2C17.4 16.6 18.2 17.8 19.8 18.6C19.6 12.4 21.4 7.2 24.6 2.4Z' +
      'M24.4 20.2C26.2 23.4 28.6 24.8 28.6 28C28.6 30.8 26.6 32.4 24 32.4C21.4 32.4 19.4 30.8 19.4 28.2C19.4 25 22.8 23.8 24.4 20.2Z',
    stroke('M6 37.8L42 44.4M42 37.8L6 44.4', 3.6),
  ),
  /** A round pot on its stones, steaming. */
  feast: icon(
    'M9.6 18.6H38.4V22.4H36.6C39.8 25 40.6 28.4 39.6 32C38 37.6 32 40.2 24 40.2C16 40.2 10 37.6 8.4 32C7.4 28.4 8.2 25 11.4 22.4H9.6Z' +
      'M13.2 27.4H34.8V29.6H13.2Z' +
      'M9.4 40.4A3.3 3.3 0 0 1 16 42.6L15.4 45.6H6.8L7.4 42.6Z' +
      'M38.6 40.4A3.3 3.3 0 0 0 32 42.6L32.6 45.6H41.2L40.6 42.6Z' +
      'M20.6 42.4H27.4L28.4 45.6H19.6Z',
    stroke(
      'M16.4 14.4C13.8 11.4 18.6 8.4 16.4 4.4M24 14.4C21.4 10.8 26.2 7 24 2.6M31.6 14.4C29 11.4 33.8 8.4 31.6 4.4',
      2.4,
    ),
  ),
  /** Take care. */
  caution: icon(
    'M21.9 20.2A2.1 2.1 0 0 1 26.1 20.2L25.4 30.4A1.4 1.4 0 0 1 22.6 30.4Z' + disc(24, 35.8, 2.3),
    stroke('M24 5.4L44 41.6H4Z', 3.6),
  ),
  /** A thatched grain store on feet. */
  store: icon(
    'M24 2.6L44.8 22.4H3.2Z' +
      'M9.6 25H38.4V38H9.6ZM19.4 28.4V38H28.6V28.4Z' +
      'M11 38H15.4L14.8 45.6H11.6ZM32.6 38H37L36.4 45.6H33.2Z',
    stroke('M6.6 39.2H41.4', 2.6),
  ),
  /** A hammer: mending and making. */
  mend: icon(
    'M8.8 12.6L20 4.2C24.6 5.2 28.8 5 33.2 3L35 5.4L30.2 12.2L24.8 16.2L20.6 14.8L12.4 19.6Z',
    stroke('M23.4 15.4L40.6 41.6', 5),
  ),
  /** A dry wall, one stone going back in. */
  wall: icon(
    'M4 36.4H14.6V44H4ZM17 36.4H31V44H17ZM33.4 36.4H44V44H33.4Z' +
      'M4 26.4H20.4V34H4ZM22.8 26.4H35.4V34H22.8ZM37.8 26.4H44V34H37.8Z' +
      'M4 16.4H12.4V24H4ZM33 16.4H44V24H33Z' +
      'M15.4 5.4L28.6 3.2L30 10.8L16.6 13Z',
    stroke('M22.7 16V21.6M19.4 19L22.7 22.2L26 19', 2.2),
  ),
  /** Ground with moisture in it. */
  soil: icon(
    'M4 17C7.2 12.6 11 12.6 13.6 15.4C16.4 10.6 21.2 10.4 24 14.6C26.8 10.4 31.6 10.6 34.4 15.4C37 12.6 40.8 12.6 44 17V43H4Z' +
      'M13.4 21.6C15.6 24.8 16 26 16 27A2.6 2.6 0 0 1 10.8 27C10.8 26 11.2 24.8 13.4 21.6Z' +
      'M24 28.6C26.2 31.8 26.6 33 26.6 34A2.6 2.6 0 0 1 21.4 34C21.4 33 21.8 31.8 24 28.6Z' +
      'M34.6 21.6C36.8 24.8 37.2 26 37.2 27A2.6 2.6 0 0 1 32 27C32 26 32.4 24.8 34.6 21.6Z' +
      'M9.6 34.6H15.2V37H9.6ZM32.8 34.6H38.4V37H32.8Z',
  ),
  moon: icon('M30.4 4.4A20 20 0 1 0 43.6 30.2A16.4 16.4 0 0 1 30.4 4.4Z'),
  /** The Sun over the edge of the land. */
  sun: icon(
    'M13 33.6A11 11 0 0 1 35 33.6Z',
    stroke('M24 6V14M7.6 14.6L13 20M40.4 14.6L35 20M3.6 29.6H8.4M39.6 29.6H44.4', 3),
    stroke('M4 38.4H44', 3),
  ),
  /** One star: four long rays, four short. */
  star: icon(
    'M24 2L27.4 16.2L36 12L31.8 20.6L46 24L31.8 27.4L36 36L27.4 31.8L24 46L20.6 31.8L12 36L16.2 27.4L2 24L16.2 20.6L12 12L20.6 16.2Z',
  ),
  /** A close group of stars. */
  cluster: icon(
    disc(8, 28, 4) +
      disc(17.4, 17.2, 4.4) +
      disc(20.6, 31.6, 4.8) +
      disc(29, 22.4, 4.2) +
      disc(31.6, 36.4, 4) +
      disc(36.2, 11.6, 3.6) +
      disc(41.4, 26, 3.4),
  ),
  /** Three stars in a row. */
  row: icon(
    disc(8.6, 35.4, 5) + disc(24, 24, 5) + disc(39.4, 12.6, 5),
    stroke('M13.6 31.7L19 27.7M29 20.3L34.4 16.3', 1.9),
  ),
  /** Frost, ice. */
  frost: icon(
    '',
    stroke('M24 3.5V44.5M6.2 13.75L41.8 34.25M41.8 13.75L6.2 34.25', 2.8),
    stroke('M18.6 6.4L24 11.4L29.4 6.4M18.6 41.6L24 36.6L29.4 41.6', 2.4),
    stroke('M6.1 19.9L13.2 17.8L11.4 10.6M41.9 28.1L34.8 30.2L36.6 37.4', 2.4),
    stroke('M41.9 19.9L34.8 17.8L36.6 10.6M6.1 28.1L13.2 30.2L11.4 37.4', 2.4),
  ),
  /** Rising water. */
  water: icon(
    '',
    stroke('M3.6 15.6C8.8 9.6 13.6 9.6 18.8 15.6C24 21.6 28.8 21.6 34 15.6C37.4 11.8 41 10.2 44.4 11.6', 3.4),
    stroke(
      'M3.6 26.6C8.8 20.6 13.6 20.6 18.8 26.6C24 32.6 28.8 32.6 34 26.6C37.4 22.8 41 21.2 44.4 22.6',
      3.4,
    ),
    stroke(
      'M3.6 37.6C8.8 31.6 13.6 31.6 18.8 37.6C24 43.6 28.8 43.6 34 37.6C37.4 33.8 41 32.2 44.4 33.6',
      3.4,
    ),
  ),
  /** Three people side by side. */
  community: icon(
    disc(24, 11.6, 5.8) +
      disc(9.8, 18.4, 4.5) +
      disc(38.2, 18.4, 4.5) +
      'M14.8 43.6V30.8C14.8 24.6 18.6 20.4 24 20.4C29.4 20.4 33.2 24.6 33.2 30.8V43.6Z' +
      'M3 43.6V34.2C3 29.4 5.8 26 9.8 25.6C11 25.6 11.8 25.8 12.8 26.2C12.4 27.6 12.2 29 12.2 30.8V43.6Z' +
      'M45 43.6V34.2C45 29.4 42.2 26 38.2 25.6C37 25.6 36.2 25.8 35.2 26.2C35.6 27.6 35.8 29 35.8 30.8V43.6Z',
  ),
  /** A house with its door open. */
  household: icon(
    'M24 4.4L45 23.4H39.4V43.6H8.6V23.4H3ZM19.4 43.6H28.6V33.2A4.6 4.6 0 0 0 19.4 33.2Z' +
      'M21.6 17.6H26.4V22.4H21.6Z',
  ),
  /** A carrying basket. */
  gather: icon(
    'M4 20.4H44L39.4 42.4A2.4 2.4 0 0 1 37 44.4H11A2.4 2.4 0 0 1 8.6 42.4Z' +
      'M15 26.2L17.2 26L18.6 38.6L16.4 38.8ZM22.9 26H25.1V38.6H22.9ZM30.8 26L33 26.2L31.6 38.8L29.4 38.6Z',
    stroke('M11.4 18.6C13.6 8.4 18 4.2 24 4.2C30 4.2 34.4 8.4 36.6 18.6', 3),
  ),
  /** An oil lamp, lit. */
  lamp: icon(
    'M3.6 24.6C10 22.6 15.4 26 20 26H40.4C41.4 33 36 38.6 28.6 39L30.6 44.6H15.4L17.4 39C10.4 37.6 8.6 29.6 3.6 24.6Z' +
      'M8.4 3.4C12.6 8.6 13.8 11.4 13.8 14.6C13.8 18 11.6 20.2 8.6 20.2C5.4 20.2 3.2 18 3.2 14.6C3.2 11.4 5.2 8.8 8.4 3.4Z',
    stroke('M40.6 28C46 27 46 34.6 38.4 34.6', 2.6),
    stroke('M24 21.4H33', 2.8),
  ),
  /** An open eye: what to look for. */
  look: icon(
    'M2.4 24C8 14 15.4 9.6 24 9.6C32.6 9.6 40 14 45.6 24C40 34 32.6 38.4 24 38.4C15.4 38.4 8 34 2.4 24Z' +
      disc(24, 24, 10.4) +
      disc(24, 24, 6.6),
  ),
} as const satisfies Record<string, IconDrawing>;

export type IconKey = keyof typeof drawings;

export const ICONS: Readonly<Record<IconKey, IconDrawing>> = drawings;

export const ICON_KEYS = Object.keys(drawings) as readonly IconKey[];

/** Whether a stored word names one of the drawn signs. */
export function isIconKey(word: string): word is IconKey {
  return Object.hasOwn(drawings, word);
}
