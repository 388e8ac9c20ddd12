export { describeCalculators } from './api-description.ts'
export { loadCalculators } from './load-registry.ts'
export type { CalculatorRegistry } from './load-registry.ts'
export { calculatorRoutes } from './routes.ts'
