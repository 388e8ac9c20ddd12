export { useKeptHeight }

import { onUpdated, type Ref } from 'vue'

/**
 * Keeps an element as tall as its words have been, so that what stands below does not jump while they change.
 * A new width counts anew.
 */
function useKeptHeight(element: Ref<HTMLElement | undefined>): void {
  let width = 0
  onUpdated(() => {
    const box = element.value
    // Nothing has a height where nothing is laid out.
    if (box === undefined || box.offsetHeight === 0) return
    if (box.offsetWidth !== width) box.style.minHeight = ''
    width = box.offsetWidth
    box.style.minHeight = `${box.offsetHeight}px`
  })
}
