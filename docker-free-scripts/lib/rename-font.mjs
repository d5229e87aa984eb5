/**
 * Gives a TrueType font another name. The OFL keeps the reserved name of a font for its unchanged form: a subset
 * is a changed form and must be called otherwise. Copyright, licence and their addresses stay in the file.
 */

const COPYRIGHT = 0;
const LICENCE = 13;
const LICENCE_URL = 14;
const WINDOWS_UNICODE_ENGLISH = [3, 1, 0x409];

/** @param {Buffer} font a TrueType file @param {string} family its new family name @returns {Buffer} */
export function renameFont(font, family) {
  const tables = readTables(font);
  const name = tables.get('name');
  if (name === undefined) throw new Error('The font has no name table.');
  const old = readNames(name);
  const names = new Map([
    [COPYRIGHT, old.get(COPYRIGHT)],
    [1, family],
    [2, 'Regular'],
    [3, `${family} Regular`],
    [4, `${family} Regular`],
    [5, old.get(5)],
    [6, `${family.replaceAll(' ', '')}-Regular`],
    [LICENCE, old.get(LICENCE)],
    [LICENCE_URL, old.get(LICENCE_URL)],
  ]);
  tables.set('name', writeNames(names));
  return writeTables(font.subarray(0, 4), tables);
}

/** @param {Buffer} font the text of one record of a font's name table @param {number} nameId */
export function fontName(font, nameId) {
  const name = readTables(font).get('name');
  return name === undefined ? undefined : readNames(name).get(nameId);
}

/** @param {Buffer} font @returns {Map<string, Buffer>} */
function readTables(font) {
  /** @type {Map<string, Buffer>} */
  const tables = new Map();
  for (let index = 0; index < font.readUInt16BE(4); index++) {
    const record = 12 + index * 16;
    const offset = font.readUInt32BE(record + 8);
    tables.set(
      font.toString('latin1', record, record + 4),
      font.subarray(offset, offset + font.readUInt32BE(record + 12)),
    );
  }
  return tables;
}

/** English names of the Windows platform, by name id. @param {Buffer} table @returns {Map<number, string>} */
function readNames(table) {
  const texts = table.readUInt16BE(4);
  /** @type {Map<number, string>} */
  const names = new Map();
  for (let index = 0; index < table.readUInt16BE(2); index++) {
    const record = 6 + index * 12;
    const isEnglish = WINDOWS_UNICODE_ENGLISH.every(
      (value, field) => table.readUInt16BE(record + field * 2) === value,
    );
    if (!isEnglish) continue;
    const start = texts + table.readUInt16BE(record + 10);
    const utf16 = Buffer.from(table.subarray(start, start + table.readUInt16BE(record + 8))).swap16();
    names.set(table.readUInt16BE(record + 6), utf16.toString('utf16le'));
  }
  return names;
}

/** @param {Map<number, string | undefined>} names in the order of their ids @returns {Buffer} */
function writeNames(names) {
  const filled = [...names].filter(([, text]) => text !== undefined);
  const header = Buffer.alloc(6 + filled.length * 12);
  header.writeUInt16BE(filled.length, 2);
  header.writeUInt16BE(header.length, 4);
  /** @type {Buffer[]} */
  const texts = [];
  let offset = 0;
  filled.forEach(([nameId, text], index) => {
    const bytes = Buffer.from(text ?? '', 'utf16le').swap16();
    const record = [...WINDOWS_UNICODE_ENGLISH, nameId, bytes.length, offset];
    record.forEach((value, field) => header.writeUInt16BE(value, 6 + index * 12 + field * 2));
    texts.push(bytes);
    offset += bytes.length;
  });
  return Buffer.concat([header, ...texts]);
}

/** @param {Buffer} version first four bytes of the font @param {Map<string, Buffer>} tables @returns {Buffer} */
function writeTables(version, tables) {
  const sorted = [...tables].sort(([a], [b]) => (a < b ? -1 : 1));
  const power = 2 ** Math.floor(Math.log2(sorted.length));
  const header = Buffer.alloc(12 + sorted.length * 16);
  version.copy(header);
  header.writeUInt16BE(sorted.length, 4);
  header.writeUInt16BE(power * 16, 6);
  header.writeUInt16BE(Math.log2(power), 8);
  header.writeUInt16BE((sorted.length - power) * 16, 10);
  /** @type {Buffer[]} */
  const bodies = [];
  let offset = header.length;
  sorted.forEach(([tag, body], index) => {
    const padded = Buffer.concat([body, Buffer.alloc((4 - (body.length % 4)) % 4)]);
    const record = 12 + index * 16;
    header.write(tag, record, 'latin1');
    header.writeUInt32BE(checksum(padded), record + 4);
    header.writeUInt32BE(offset, record + 8);
    header.writeUInt32BE(body.length, record + 12);
    bodies.push(padded);
    offset += padded.length;
  });
  return Buffer.concat([header, ...bodies]);
}

/** @param {Buffer} padded a table filled up to whole words of four bytes */
function checksum(padded) {
  let sum = 0;
  for (let at = 0; at < padded.length; at += 4) sum = (sum + padded.readUInt32BE(at)) >>> 0;
  return sum;
}
