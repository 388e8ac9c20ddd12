import { startIslands } from './client.ts'

startIslands()
