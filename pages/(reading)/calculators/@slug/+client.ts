import { startIslands } from '#renderer/islands/client.ts'

startIslands()
