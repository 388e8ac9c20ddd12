export { useDraft }
export type { DraftDesk, OtherCopy, WordsState }

import { computed, onBeforeUnmount, onMounted, reactive, ref, shallowRef, watch } from 'vue'
import { createDeviceCopies } from './device-copy.ts'
import { createDraftKeeper, type DraftKeeper, type KeeperState, type Snapshot } from './draft-keeper.ts'
import { draftContent, editableDraft, sameDraft } from './draft-model.ts'
import { fetchCopy, saveDraft } from './edit-requests.ts'

/** Another copy of the same draft that a person has to choose between; neither is thrown away before they have. */
interface OtherCopy extends Snapshot {
  /** Where it comes from: kept by this device, or saved at the club by another tab or device. */
  from: 'device' | 'club'
  at: string
  version: number
}

interface Start {
  id: string
  version: number
  updatedAt: string
  /** What the club has. */
  kept: Snapshot
  /** What the form begins with: the same, or words that were refused, or both sides put together. */
  start: Snapshot
  /** What the form begins with is only proposed: nothing of it is saved before the writer does something. */
  proposed: boolean
}

/** Where the newest words are; `unsaved` is a page that came back with words that were refused, or are only proposed. */
type WordsState = KeeperState | { name: 'unsaved' }

type DraftDesk = ReturnType<typeof useDraft>

/**
 * The life of a draft on the page: what is typed, where the newest words are kept, and which other copies there are.
 * Nothing here runs before the page is mounted, so that server and browser begin alike.
 */
function useDraft({ id, version: startVersion, updatedAt, kept, start, proposed }: Start) {
  const draft = reactive(editableDraft(start.content))
  const summary = ref(start.summary)
  const isKept = sameDraft(start.content, kept.content) && start.summary.trim() === kept.summary.trim()
  const state = ref<WordsState>(isKept ? { name: 'saved', at: new Date(updatedAt) } : { name: 'unsaved' })
  const version = ref(startVersion)
  const other = shallowRef<OtherCopy | null>(null)
  /** The copy that was not gone on with, so that the choice can be taken back. */
  const putAside = shallowRef<Snapshot | null>(null)
  const restoredFrom = ref<string | null>(null)
  const newest = computed((): Snapshot => ({ content: draftContent(draft), summary: summary.value }))
  let keeper: DraftKeeper | undefined
  let copies: ReturnType<typeof createDeviceCopies> | undefined

  function show({ content, summary: line }: Snapshot): void {
    Object.assign(draft, editableDraft(content))
    summary.value = line
  }

  async function follow(next: KeeperState): Promise<void> {
    state.value = next
    version.value = keeper!.version
    if (next.name !== 'conflict' || other.value !== null) return
    const copy = await fetchCopy(id)
    if (copy !== null) other.value = { ...copy, from: 'club', at: copy.updatedAt }
  }

  /** Goes on with the words in the form; they are saved over the other copy, which has been seen. */
  function keepMine(): void {
    const copy = other.value!
    putAside.value = { content: copy.content, summary: copy.summary }
    settle(copy)
  }

  /** Puts the other copy into the form and goes on with that. */
  function takeOther(): void {
    const copy = other.value!
    putAside.value = newest.value
    show(copy)
    settle(copy)
  }

  function settle(copy: OtherCopy): void {
    other.value = null
    restoredFrom.value = null
    if (copy.from === 'device') forgetDevice(copy)
    const club = copy.from === 'club' ? copy : { ...kept, version: keeper!.version }
    keeper!.goOn({ version: club.version, saved: normalised(club) }, newest.value)
  }

  function forgetDevice(copy: OtherCopy): void {
    copies?.forget({ content: copy.content, summary: copy.summary, version: copy.version, keptAt: copy.at })
  }

  /** The choice was wrong after all: the copy that was put aside comes back. */
  function takeBack(): void {
    const copy = putAside.value!
    putAside.value = newest.value
    show(copy)
  }

  /** Words that this device kept and the club never got. Never put over a version that they were not written on. */
  function restore(): void {
    const copy = copies!.newest()
    if (copy === null) return
    const same = sameDraft(copy.content, kept.content) && copy.summary.trim() === kept.summary.trim()
    if (same) {
      copies!.forget(copy)
    } else if (copy.version === startVersion) {
      putAside.value = normalised(kept)
      show(copy)
      restoredFrom.value = copy.keptAt
      copies!.forget(copy)
    } else {
      other.value = { content: copy.content, summary: copy.summary, version: copy.version, from: 'device', at: copy.keptAt }
    }
  }

  onMounted(() => {
    copies = createDeviceCopies(storage('localStorage'), id, tabName())
    keeper = createDraftKeeper(
      { version: startVersion, saved: normalised(kept), savedAt: new Date(updatedAt) },
      {
        save: (snapshot, on, options) => saveDraft(id, snapshot, on, options),
        device: copies,
        now: () => new Date(),
        later(milliseconds, run) {
          const timer = setTimeout(run, milliseconds)
          return () => clearTimeout(timer)
        },
      },
      (next) => void follow(next),
    )
    // Words that the club refused a moment ago are newer than anything this device has kept.
    if (isKept) restore()
    watch(newest, (snapshot) => keeper!.typed(snapshot), { immediate: !proposed })
    watch(() => keeper!.wouldLose && state.value.name !== 'saved', warnBeforeLeaving)
    addEventListener('online', backOnline)
    addEventListener('pagehide', leave)
    document.addEventListener('visibilitychange', hidden)
  })
  onBeforeUnmount(() => {
    keeper?.stop()
    removeEventListener('online', backOnline)
    removeEventListener('pagehide', leave)
    removeEventListener('beforeunload', stay)
    document.removeEventListener('visibilitychange', hidden)
  })

  const backOnline = () => keeper?.online()
  const leave = () => keeper?.leave()
  const hidden = () => document.visibilityState === 'hidden' && leave()
  const stay = (event: BeforeUnloadEvent) => event.preventDefault()
  function warnBeforeLeaving(would: boolean): void {
    if (would) addEventListener('beforeunload', stay)
    else removeEventListener('beforeunload', stay)
  }

  return {
    draft, summary, state, version, other, putAside, restoredFrom, newest,
    keepMine, takeOther, takeBack,
    wouldLose: () => keeper?.wouldLose ?? false,
    saveNow: () => keeper!.saveNow(),
  }
}

/** As the form gives it back, so that a draft nobody has touched counts as saved. */
function normalised({ content, summary }: Snapshot): Snapshot {
  return { content: draftContent(editableDraft(content)), summary }
}

function storage(kind: 'localStorage' | 'sessionStorage'): Storage | null {
  try {
    return window[kind]
  } catch {
    return null
  }
}

/** A name for this tab that lasts as long as the tab. */
function tabName(): string {
  const kept = storage('sessionStorage')
  const name = kept?.getItem('tab') ?? crypto.randomUUID()
  try {
    kept?.setItem('tab', name)
  } catch {
    // The name then lasts until the next load, which is long enough to keep two tabs apart.
  }
  return name
}
