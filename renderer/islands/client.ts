export { startIslands }

/** How far from the screen an island may be when its code is fetched. */
const NEAR = '300px 0px'

/**
 * The whole script of a read page: it waits until an island is near the screen, touched or focused, and only then fetches
 * Vue and that island. A page without islands fetches nothing more; an island whose code does not arrive stays the plain
 * form that the server answers.
 */
function startIslands(root: ParentNode = document): void {
  for (const element of root.querySelectorAll<HTMLElement>('[data-island]')) waitFor(element)
}

function waitFor(element: HTMLElement): void {
  const touches = ['pointerdown', 'focusin', 'keydown'] as const
  let state: 'waiting' | 'coming' | 'alive' = 'waiting'
  let pressed: HTMLElement | null = null

  // A plain button pressed before the island is alive would do nothing, so it is pressed again afterwards.
  const remember = (event: Event) => {
    pressed = (event.target as Element).closest<HTMLElement>('button[type=button]')
  }

  const wake = async () => {
    if (state !== 'waiting') return
    state = 'coming'
    try {
      const { mountIsland } = await import('./mount-island.ts')
      await mountIsland(element)
    } catch {
      // No signal, most likely: the next touch tries again.
      state = 'waiting'
      return
    }
    state = 'alive'
    observer.disconnect()
    for (const touch of touches) element.removeEventListener(touch, wake)
    element.removeEventListener('click', remember)
    element.dataset.alive = ''
    if (pressed?.isConnected) pressed.click()
  }

  const observer = new IntersectionObserver(
    (entries) => {
      if (entries.some((entry) => entry.isIntersecting)) void wake()
    },
    { rootMargin: NEAR },
  )
  observer.observe(element)
  for (const touch of touches) element.addEventListener(touch, wake, { passive: true })
  element.addEventListener('click', remember)
}
