// Makes the small woff2 files of this folder from the full variable fonts in @fontsource-variable.
// Run after changing a font or the character set: `npm install --no-save subset-font fontverter && node renderer/fonts/subset.mjs`.
//
// Nearly half of a Merriweather file is its kerning table, and that table grows with the square of the number of characters.
// So the letters, which need kerning, stand in one file, and figures and signs, which do not, in another. What hardly a page
// needs has a file for itself; every other character still comes from the full file (styles/fonts.css, unicode-range).
//
// Both fonts keep their names reserved under the SIL Open Font License, so what is changed here goes by other names: Camber Read
// and Camber Work. The licences stand beside the files.
import { readFile, writeFile } from 'node:fs/promises'
import fontverter from 'fontverter'
import subsetFont from 'subset-font'
import { withName } from './name-table.mjs'

const source = new URL('../../node_modules/@fontsource-variable/', import.meta.url)
const here = new URL('./', import.meta.url)

const lower = 'abcdefghijklmnopqrstuvwxyz'
const letters = `${lower}${lower.toUpperCase()} \u00a0.,-?&’`
const signs = '0123456789!"%\'()+/:;=_°²³·½×–—‘“”…−'
const rare = '#$*<>@[\\]^`{|}~§±µ¼¾äéöü'

const merriweather = 'merriweather/files/merriweather-latin-opsz-normal.woff2'
const merriweatherItalic = 'merriweather/files/merriweather-latin-opsz-italic.woff2'
const encodeSans = 'encode-sans/files/encode-sans-latin-wdth-normal.woff2'

// Optical sizes: 18 is the sturdiest the font has, for 17 px text; 36 draws tight, for titles.
const text = { wght: 400, opsz: 18 }
const sign = { wght: 780, opsz: 36 }
const work = { wght: { min: 460, max: 700 }, wdth: 100 }
const figures = ['tnum', 'lnum']

const files = [
  { name: 'camber-read-text', from: merriweather, characters: letters, axes: text, features: ['kern'] },
  { name: 'camber-read-text-signs', from: merriweather, characters: signs, axes: text, features: [] },
  { name: 'camber-read-sign', from: merriweather, characters: letters, axes: sign, features: ['kern'] },
  { name: 'camber-read-sign-signs', from: merriweather, characters: signs, axes: sign, features: [] },
  { name: 'camber-read-italic', from: merriweatherItalic, characters: letters + signs + rare, axes: text, features: [] },
  { name: 'camber-read-rare', from: merriweather, characters: rare, axes: text, features: [] },
  { name: 'camber-work', from: encodeSans, characters: `${letters}${signs}äéöü`, axes: work, features: figures },
  { name: 'camber-work-rare', from: encodeSans, characters: rare, axes: work, features: figures },
]

for (const { name, from, characters, axes, features } of files) {
  const bare = await subsetFont(await readFile(new URL(from, source)), characters, {
    targetFormat: 'sfnt',
    variationAxes: axes,
    keepFeatures: features,
    noHinting: true,
    dropTables: ['name'],
  })
  const words = from.startsWith('merriweather')
    ? { family: 'Camber Read', copyright: 'Altered from a font copyright 2024 The Merriweather Project Authors' }
    : { family: 'Camber Work', copyright: 'Altered from a font copyright 2020 The Encode Project Authors' }
  const font = await fontverter.convert(withName(bare, words), 'woff2')
  await writeFile(new URL(`${name}.woff2`, here), font)
  process.stdout.write(`${name}.woff2 ${font.length} bytes\n`)
}
