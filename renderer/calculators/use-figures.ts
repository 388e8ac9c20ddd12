export { useFigures }
export type { Figures }

import { computed, ref } from 'vue'
import type { Instrument } from './use-instrument.ts'

type Figures = ReturnType<typeof useFigures>

/**
 * The drawings and plots of the last answer, where the cursor stands among them, and what a drawing needs to be
 * taken hold of.
 */
function useFigures({ alive, definition, lastGood, setMany }: Instrument) {
  const { cursor } = definition
  const good = computed(() => (lastGood.value.ok ? lastGood.value : undefined))
  const ends = computed(() => (cursor && good.value ? cursor.ends(good.value.inputs) : undefined))
  const gone = ref(cursor?.start ?? 0)
  const at = computed(() =>
    ends.value === undefined ? 0 : Math.min(ends.value[1], Math.max(ends.value[0], gone.value)),
  )
  const drawings = computed(() =>
    good.value ? (definition.drawings?.(good.value.inputs, good.value.outputs, at.value) ?? []) : [],
  )
  const plots = computed(() =>
    good.value ? (definition.plots?.(good.value.inputs, good.value.outputs, at.value) ?? []) : [],
  )
  // A point on a linkage that has moved is not where its values say, so it can be taken only where the
  // movement starts.
  const grip = computed(() =>
    alive.value && good.value && at.value === (cursor?.start ?? 0)
      ? { definition, inputs: good.value.inputs, set: setMany }
      : undefined,
  )
  const go = (place: number) => {
    gone.value = place
  }
  return { cursor, ends, at, go, drawings, plots, grip }
}
