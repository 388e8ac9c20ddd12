export { createDraftKeeper }
export type { DeviceCopy, DraftKeeper, KeeperPorts, KeeperState, SaveAnswer, Snapshot }

import type { GuideDraft } from '#shared/schemas/guide-content.ts'
import type { Problem } from '../../parts/problem-fields.ts'

interface Snapshot {
  content: GuideDraft
  summary: string
}

/** The newest words, kept on this device until the club has them. `version` is the club's version they were written on. */
interface DeviceCopy extends Snapshot {
  version: number
  keptAt: string
}

type SaveAnswer =
  | { kind: 'saved'; version: number }
  /** The club holds a newer version than the one these words were written on. */
  | { kind: 'stale' }
  | { kind: 'refused'; message: string; problems: Problem[] }
  /** No connection, or a club that cannot answer just now; worth another try. */
  | { kind: 'unreachable'; message?: string; retryAfterSeconds?: number }

/** Everything the keeper needs from outside, so that it can be tried without a browser. */
interface KeeperPorts {
  save(snapshot: Snapshot, version: number, options: { leaving: boolean }): Promise<SaveAnswer>
  device: {
    /** False when this device cannot keep it. */
    write(copy: DeviceCopy): boolean
    clear(): void
  }
  now(): Date
  /** Runs something later; returns what calls it off. */
  later(milliseconds: number, run: () => void): () => void
}

type KeeperState =
  | { name: 'saved'; at: Date }
  /** Newer words than the club has, already kept on this device. */
  | { name: 'newer'; savedAt: Date }
  | { name: 'saving' }
  | { name: 'device_only'; at: Date; message: string | undefined }
  | { name: 'refused'; message: string; problems: Problem[] }
  | { name: 'conflict' }

interface DraftKeeper {
  readonly state: KeeperState
  /** The club's version that the next save builds on. */
  readonly version: number
  /** Newer words than the club has, and this device cannot keep them either: leaving would lose them. */
  readonly wouldLose: boolean
  typed(snapshot: Snapshot): void
  /** Saves at once; true when the club has everything that was typed so far. */
  saveNow(): Promise<boolean>
  /** The page is being left or hidden: a last try that outlives it. */
  leave(): void
  /** The connection is back. */
  online(): void
  /** Goes on from another version of the club's, after a person has chosen between two copies. */
  goOn(from: { version: number; saved: Snapshot }, newest: Snapshot): void
  stop(): void
}

/** At most one save in this time, so that typing does not turn into traffic. */
const LEAST_BETWEEN_SAVES = 15_000
/** The first save waits for the hand to rest. */
const FIRST_SAVE = 1_500
const RETRIES = [5_000, 10_000, 20_000, 40_000, 80_000, 120_000]

/**
 * Keeps a draft: on this device at every change, at the club at most every 15 seconds, and says where the newest words are.
 * Never sends over a version it has not seen: a stale save stops it until a person has chosen.
 */
function createDraftKeeper(
  start: { version: number; saved: Snapshot; savedAt: Date },
  ports: KeeperPorts,
  changed: (state: KeeperState) => void,
): DraftKeeper {
  let { version } = start
  let savedKey = keyOf(start.saved)
  let savedAt = start.savedAt
  let newest = start.saved
  let state: KeeperState = { name: 'saved', at: savedAt }
  let deviceFailed = false
  let lastStarted = -Infinity
  let tries = 0
  let cancel: (() => void) | undefined
  let running: Promise<void> | undefined

  const dirty = () => keyOf(newest) !== savedKey
  const show = (next: KeeperState) => {
    state = next
    changed(next)
  }

  function keepOnDevice(): void {
    deviceFailed = !ports.device.write({ ...newest, version, keptAt: ports.now().toISOString() })
  }

  function schedule(milliseconds: number): void {
    cancel?.()
    cancel = ports.later(milliseconds, () => {
      cancel = undefined
      void save(false)
    })
  }

  function callOff(): void {
    cancel?.()
    cancel = undefined
  }

  function save(leaving: boolean): Promise<void> {
    callOff()
    if (running !== undefined || state.name === 'conflict' || !dirty()) return running ?? Promise.resolve()
    const sent = newest
    lastStarted = ports.now().getTime()
    show({ name: 'saving' })
    running = ports
      .save(sent, version, { leaving })
      .catch((): SaveAnswer => ({ kind: 'unreachable' }))
      .then((answer) => {
        running = undefined
        take(answer, sent)
      })
    return running
  }

  function take(answer: SaveAnswer, sent: Snapshot): void {
    if (answer.kind === 'saved') {
      version = answer.version
      savedKey = keyOf(sent)
      savedAt = ports.now()
      tries = 0
      if (!dirty()) {
        ports.device.clear()
        deviceFailed = false
        show({ name: 'saved', at: savedAt })
        return
      }
      keepOnDevice()
      show({ name: 'newer', savedAt })
      schedule(LEAST_BETWEEN_SAVES)
    } else if (answer.kind === 'stale') {
      keepOnDevice()
      show({ name: 'conflict' })
    } else if (answer.kind === 'refused') {
      keepOnDevice()
      show({ name: 'refused', message: answer.message, problems: answer.problems })
    } else {
      keepOnDevice()
      show({ name: 'device_only', at: ports.now(), message: answer.message })
      const wait = RETRIES[Math.min(tries, RETRIES.length - 1)]!
      tries += 1
      schedule(Math.max(wait, (answer.retryAfterSeconds ?? 0) * 1000))
    }
  }

  return {
    get state() {
      return state
    },
    get version() {
      return version
    },
    get wouldLose() {
      return deviceFailed && dirty()
    },
    typed(snapshot) {
      newest = snapshot
      if (!dirty()) {
        // Typed back to what the club has: there is nothing to send, also when it just could not be reached.
        if (state.name === 'conflict' || running !== undefined) return
        callOff()
        ports.device.clear()
        deviceFailed = false
        show({ name: 'saved', at: savedAt })
        return
      }
      keepOnDevice()
      if (state.name === 'conflict' || running !== undefined) return
      if (state.name === 'saved' || state.name === 'refused') show({ name: 'newer', savedAt })
      if (cancel === undefined) {
        schedule(Math.max(FIRST_SAVE, lastStarted + LEAST_BETWEEN_SAVES - ports.now().getTime()))
      }
    },
    async saveNow() {
      while (running !== undefined) await running
      await save(false)
      return !dirty()
    },
    leave() {
      if (!dirty()) return
      keepOnDevice()
      void save(true)
    },
    online() {
      if (state.name === 'device_only') void save(false)
    },
    goOn(from, chosen) {
      version = from.version
      savedKey = keyOf(from.saved)
      savedAt = ports.now()
      newest = chosen
      tries = 0
      callOff()
      if (dirty()) {
        keepOnDevice()
        show({ name: 'newer', savedAt })
        schedule(FIRST_SAVE)
      } else {
        ports.device.clear()
        show({ name: 'saved', at: savedAt })
      }
    },
    stop: callOff,
  }
}

function keyOf(snapshot: Snapshot): string {
  return JSON.stringify([snapshot.content, snapshot.summary])
}
