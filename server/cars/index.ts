// The door: what the rest of the server may use of cars. Pages take each service from its own file, so that they bundle no other.
export { carsApi } from './api.ts'
export { carsDescription } from './api-description.ts'
export { carsForms } from './forms.ts'
