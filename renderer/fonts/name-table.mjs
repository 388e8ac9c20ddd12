/**
 * Gives an sfnt font another name: replaces its `name` table by one that holds the family, the style and the licence's
 * copyright line. Browsers refuse a font without that table, and the licence refuses the old name to an altered font.
 * Table layout: ISO/IEC 14496-22 (Open Font Format), "name" and the table directory.
 *
 * @param {Buffer} font sfnt bytes without a `name` table
 * @param {{ family: string, copyright: string }} words
 * @returns {Buffer}
 */
export function withName(font, { family, copyright }) {
  const tables = readTables(font)
  tables.push({ tag: 'name', data: nameTable([[0, copyright], [1, family], [2, 'Regular'], [4, family], [6, family.replaceAll(' ', '')]]) })
  tables.sort((one, other) => (one.tag < other.tag ? -1 : 1))
  return writeTables(font.subarray(0, 4), tables)
}

function readTables(font) {
  return Array.from({ length: font.readUInt16BE(4) }, (_, at) => {
    const entry = 12 + 16 * at
    const from = font.readUInt32BE(entry + 8)
    return { tag: font.toString('latin1', entry, entry + 4), data: font.subarray(from, from + font.readUInt32BE(entry + 12)) }
  })
}

/** Windows platform, Unicode, British English: the one record set that every reader of fonts knows. */
function nameTable(words) {
  const texts = words.map(([id, text]) => ({ id, bytes: Buffer.from(text, 'utf16le').swap16() }))
  const head = Buffer.alloc(6 + 12 * texts.length)
  head.writeUInt16BE(texts.length, 2)
  head.writeUInt16BE(head.length, 4)
  let offset = 0
  texts.forEach(({ id, bytes }, at) => {
    const record = [3, 1, 0x0809, id, bytes.length, offset]
    record.forEach((value, field) => head.writeUInt16BE(value, 6 + 12 * at + 2 * field))
    offset += bytes.length
  })
  return Buffer.concat([head, ...texts.map((text) => text.bytes)])
}

function writeTables(version, tables) {
  const power = 2 ** Math.floor(Math.log2(tables.length))
  const head = Buffer.alloc(12 + 16 * tables.length)
  version.copy(head)
  const header = [tables.length, power * 16, Math.log2(power), (tables.length - power) * 16]
  header.forEach((value, field) => head.writeUInt16BE(value, 4 + 2 * field))
  const parts = [head]
  let offset = head.length
  tables.forEach(({ tag, data }, at) => {
    const padded = Buffer.concat([data, Buffer.alloc((4 - (data.length % 4)) % 4)])
    const entry = 12 + 16 * at
    head.write(tag, entry, 'latin1')
    head.writeUInt32BE(checksum(padded), entry + 4)
    head.writeUInt32BE(offset, entry + 8)
    head.writeUInt32BE(data.length, entry + 12)
    parts.push(padded)
    offset += padded.length
  })
  return Buffer.concat(parts)
}

function checksum(padded) {
  let sum = 0
  for (let at = 0; at < padded.length; at += 4) sum = (sum + padded.readUInt32BE(at)) >>> 0
  return sum
}
