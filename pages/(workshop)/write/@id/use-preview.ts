export { usePreview }

import { onMounted, ref, shallowRef, watch, type Ref } from 'vue'
import { loadCalculator } from '#renderer/calculators/load-calculators.ts'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'
import { previewPage, type GuidePreview } from '../../parts/guide-preview.ts'
import { fetchPreview } from './edit-requests.ts'
import type { Snapshot } from './draft-keeper.ts'

/** How long the hand rests before the page is laid out again. */
const REST = 700
const RETRY = 5_000

/**
 * The draft as it will be published, laid out again after each rest. The last good page stays until the next one is ready;
 * `trouble` says why there is none.
 */
function usePreview(newest: Ref<Snapshot>, mark: string, start: { preview: GuidePreview | null; unreadable: string }) {
  const page = shallowRef(start.preview)
  const trouble = ref(start.unreadable)
  const busy = ref(false)
  let waiting: ReturnType<typeof setTimeout> | undefined
  let running: AbortController | undefined

  async function layOut(): Promise<void> {
    running?.abort()
    const own = new AbortController()
    running = own
    busy.value = true
    const { content } = newest.value
    try {
      const answer = await fetchPreview(content, own.signal)
      if (answer.kind === 'ready') {
        const calculators = await loadCalculators(answer.preview.parts)
        if (own.signal.aborted) return
        page.value = previewPage({ content, mark, preview: answer.preview }, calculators)
        trouble.value = ''
      } else if (answer.kind === 'refused') {
        trouble.value = answer.message
      } else {
        trouble.value = 'The club cannot be reached. This is how it read before.'
        later(Math.max(RETRY, (answer.retryAfterSeconds ?? 0) * 1000))
      }
    } catch (error) {
      if (!own.signal.aborted) throw error
    } finally {
      if (running === own) busy.value = false
    }
  }

  function later(milliseconds: number): void {
    clearTimeout(waiting)
    waiting = setTimeout(() => void layOut(), milliseconds)
  }

  onMounted(() => {
    let shown = JSON.stringify(newest.value.content)
    watch(newest, ({ content }) => {
      const now = JSON.stringify(content)
      if (now === shown) return
      shown = now
      later(REST)
    })
  })
  return { page, trouble, busy }
}

/** The definitions that a body's parts need; one that does not exist leaves its part out, as the published page does. */
async function loadCalculators(parts: readonly { kind: string; slug?: string }[]): Promise<Map<string, CalculatorDefinition>> {
  const slugs = [...new Set(parts.flatMap((part) => (part.slug === undefined ? [] : [part.slug])))]
  const loaded = await Promise.allSettled(slugs.map((slug) => loadCalculator(slug)))
  return new Map(slugs.flatMap((slug, at) => {
    const result = loaded[at]!
    return result.status === 'fulfilled' ? [[slug, result.value] as const] : []
  }))
}

