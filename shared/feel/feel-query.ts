export { feelAddress, readFeelQuery }
export type { FeelProblem, FeelQuery, FeelReading }

import { complaintKey, complaintWords } from '#shared/vocabulary/complaints.ts'
import { BITES, CAR_CLASSES, SURFACES } from '#shared/vocabulary/conditions.ts'
import { CHANGES } from '#shared/vocabulary/effect-words.ts'
import { PHASES, phases } from '#shared/vocabulary/phases.ts'
import { QUALITIES } from '#shared/vocabulary/qualities.ts'
import type { FeelConditions } from './fit.ts'
import type { FeelComplaint } from './rank-changes.ts'

/** What a reader asks by feel. */
interface FeelQuery extends FeelConditions {
  complaints: FeelComplaint[]
  /** Time before the next heat. */
  minutes?: number
}

interface FeelProblem {
  field: string
  message: string
  /** What could stand there, as addresses and programs write it. */
  known?: readonly string[]
}

/** What could be read, and words for what could not: an old link still answers as far as it can. */
interface FeelReading {
  query: FeelQuery
  problems: FeelProblem[]
}

type Raw = Readonly<Record<string, string | readonly string[] | undefined>>

const mostComplaints = 3
const mostMinutes = 600
const fields = ['complaint', 'class', 'surface', 'bite', 'minutes']

/**
 * Reads `complaint=entry.steering.more&complaint=…&class=buggy_8e&surface=loose&bite=low&minutes=20`. Every part may be
 * missing. A complaint named twice counts once.
 */
function readFeelQuery(raw: Raw): FeelReading {
  const problems: FeelProblem[] = []
  const say = (field: string, message: string, known?: readonly string[]) => {
    problems.push({ field, message, ...(known && { known }) })
    return undefined
  }
  const choice = <T extends string>(field: string, known: readonly T[]): T | undefined => {
    const [text = ''] = textsOf(raw[field])
    const found = known.find((each) => each === text)
    if (found !== undefined || text === '') return found
    return say(field, `“${text}” is not a ${field} that we know.`, known)
  }
  const carClass = choice('class', CAR_CLASSES)
  const surface = choice('surface', SURFACES)
  const bite = choice('bite', BITES)
  const minutes = readMinutes(textsOf(raw['minutes'])[0] ?? '', say)
  const complaints = readComplaints(textsOf(raw['complaint']), say)
  for (const name of Object.keys(raw)) {
    if (!fields.includes(name)) say(name, `“${name}” is not asked here.`, fields)
  }
  return {
    problems,
    query: {
      complaints,
      ...(carClass && { carClass }),
      ...(surface && { surface }),
      ...(bite && { bite }),
      ...(minutes !== undefined && { minutes }),
    },
  }
}

type Say = (field: string, message: string, known?: readonly string[]) => undefined

function readComplaints(texts: readonly string[], say: Say): FeelComplaint[] {
  const read: FeelComplaint[] = []
  for (const text of new Set(texts.filter((each) => each !== ''))) {
    const [phaseText, qualityText, wantsText, ...rest] = text.split('.')
    const phase = PHASES.find((each) => each === phaseText)
    const quality = QUALITIES.find((each) => each === qualityText)
    const wants = CHANGES.find((each) => each === wantsText)
    if (phase === undefined || quality === undefined || wants === undefined || rest.length > 0) {
      say('complaint', `“${text}” is not a complaint that we know. One is written as part of the lap, quality and what you want: entry.steering.more.`)
      continue
    }
    const against = read.find((each) => each.phase === phase && each.quality === quality)
    if (against !== undefined) {
      say('complaint', `“${complaintWords(against)}” and “${complaintWords({ phase, quality, wants })}” at ${phases[phase].name.toLowerCase()} want the opposite of each other. Keep the one that costs you more time.`)
      continue
    }
    read.push({ phase, quality, wants })
  }
  if (read.length > mostComplaints) {
    say('complaint', `At most ${mostComplaints} complaints at once: take the ones that cost you most. A car with more is better looked over first.`)
  }
  return read.slice(0, mostComplaints)
}

function readMinutes(text: string, say: Say): number | undefined {
  if (text === '') return undefined
  const minutes = /^-?\d{1,6}$/.test(text) ? Number(text) : undefined
  if (minutes === undefined || minutes < 0 || minutes > mostMinutes) {
    return say('minutes', `Minutes before the next heat: a whole number from 0 to ${mostMinutes}.`)
  }
  return minutes
}

function textsOf(value: string | readonly string[] | undefined): readonly string[] {
  return value === undefined ? [] : typeof value === 'string' ? [value.trim()] : value.map((each) => String(each).trim())
}

/** The address of a page or of the API that asks this; always the same for the same question. */
function feelAddress(path: string, { complaints, carClass, surface, bite, minutes }: FeelQuery): string {
  const parameters = new URLSearchParams(complaints.map((complaint) => ['complaint', complaintKey(complaint)]))
  if (carClass) parameters.set('class', carClass)
  if (surface) parameters.set('surface', surface)
  if (bite) parameters.set('bite', bite)
  if (minutes !== undefined) parameters.set('minutes', String(minutes))
  const text = parameters.toString()
  return text === '' ? path : `${path}?${text}`
}
