export { createBoundedMemo }
export type { BoundedMemo }

interface BoundedMemo {
  /** What was made for this key before, or what `make` makes now. */
  get(key: string, make: () => Promise<string>): Promise<string>
}

/** Keeps texts that are dear to make, up to `most` characters in all; what was not asked for longest goes first. */
function createBoundedMemo(most: number): BoundedMemo {
  const kept = new Map<string, string>()
  let characters = 0

  function forget(key: string): void {
    characters -= kept.get(key)?.length ?? 0
    kept.delete(key)
  }

  function keep(key: string, text: string): void {
    forget(key)
    kept.set(key, text)
    characters += text.length
    for (const oldest of kept.keys()) {
      if (characters <= most) break
      forget(oldest)
    }
  }

  return {
    async get(key, make) {
      const text = kept.get(key) ?? (await make())
      keep(key, text)
      return text
    },
  }
}
