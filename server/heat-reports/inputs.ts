export { HeatReportInput, NOTE_AT_MOST, ReportId, SetAsideInput }

import { z } from 'zod'
import { cleanText, optionalText } from '#shared/schemas/text.ts'
import { BITES, CAR_CLASSES, SURFACES } from '#shared/vocabulary/conditions.ts'
import { DIRECTIONS } from '#shared/vocabulary/effect-words.ts'
import { VERDICTS } from '#shared/vocabulary/verdicts.ts'

const NOTE_AT_MOST = 300
const WHICH = 'Change: say which one you tried.'

const HeatReportInput = z.strictObject({
  adjustable: z.string({ error: WHICH }).regex(/^[a-z_]{1,60}$/, { error: WHICH }),
  direction: z.enum(DIRECTIONS, { error: WHICH }),
  verdict: z.enum(VERDICTS, { error: 'How it went: say whether it helped, made no difference or made it worse.' }),
  carClass: z.enum(CAR_CLASSES, { error: 'Class: choose the car you tried it on.' }),
  surface: z.enum(SURFACES, { error: 'Ground: choose what you drove on.' }),
  bite: z.enum(BITES, { error: 'Bite: choose how much the track gave.' }),
  note: optionalText('Note', NOTE_AT_MOST),
})

const ReportId = z.strictObject({ id: z.uuid({ error: 'Report: there is none with this id.' }) })
const SetAsideInput = ReportId.extend({ reason: cleanText('Reason', 3, 300) })
