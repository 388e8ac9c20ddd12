export { heatReportsDescription }

import { z } from 'zod'
import type { ApiDescription } from '../http/openapi/describe.ts'
import { HeatReportsQuery } from './api.ts'
import { HeatReportInput, SetAsideInput } from './inputs.ts'
import { HEAT_REPORT_SHAPE } from './report-rows.ts'

const params = { id: z.uuid() }
const WhySetAside = SetAsideInput.omit({ id: true })
const NONE = 'There is no such report.'

const heatReportsDescription: ApiDescription = {
  name: 'Heat reports',
  about: 'Whether a change held when a member tried it: helped, no difference or worse, with class, ground and bite.',
  answers: { HeatReport: HEAT_REPORT_SHAPE },
  inputs: { NewHeatReport: HeatReportInput, WhySetAside },
  operations: {
    'GET /heat-reports': {
      id: 'listHeatReports',
      summary: 'One’s own reports, the newest first; for moderators everyone’s.',
      who: 'members',
      query: HeatReportsQuery,
      answers: { 200: { says: 'The reports; those that do not count say why.', body: z.array(HEAT_REPORT_SHAPE) } },
    },
    'POST /heat-reports': {
      id: 'saveHeatReport',
      summary: 'Says how a change went. One a member for each change and condition: a second replaces the first.',
      who: 'verified members',
      limited: true,
      body: HeatReportInput,
      answers: {
        200: { says: 'The report, in place of the earlier one.', body: HEAT_REPORT_SHAPE },
        201: { says: 'The report.', body: HEAT_REPORT_SHAPE },
      },
      problems: { 409: 'A moderator has set the earlier one aside (`set_aside`).' },
    },
    'DELETE /heat-reports/:id': {
      id: 'takeBackHeatReport',
      summary: 'Takes one of one’s own reports back.',
      who: 'members',
      params,
      answers: { 204: { says: 'It is gone.' } },
      problems: { 404: 'There is no such report among one’s own.', 409: 'A moderator has set it aside (`set_aside`).' },
    },
    'POST /heat-reports/:id/set-aside': {
      id: 'setAsideHeatReport',
      summary: 'Does not let a report count, for a reason that its writer reads.',
      who: 'moderators',
      params,
      body: WhySetAside,
      answers: { 200: { says: 'The report.', body: HEAT_REPORT_SHAPE } },
      problems: { 404: NONE },
    },
    'DELETE /heat-reports/:id/set-aside': {
      id: 'letHeatReportCount',
      summary: 'Lets a report count again.',
      who: 'moderators',
      params,
      answers: { 200: { says: 'The report.', body: HEAT_REPORT_SHAPE } },
      problems: { 404: NONE },
    },
  },
}
