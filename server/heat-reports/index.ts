// The door: what the rest of the server may use of heat reports. Pages take each service from its own file, so that they bundle no other.
export { heatReportsApi } from './api.ts'
export { heatReportsDescription } from './api-description.ts'
export { heatReportsForms } from './forms.ts'
