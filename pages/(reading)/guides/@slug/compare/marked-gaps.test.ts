import { describe, expect, it } from 'vitest'
import { withoutMarkedGaps } from './marked-gaps.ts'

describe('withoutMarkedGaps', () => {
  it('marks the words and not the empty lines between them', () => {
    expect(withoutMarkedGaps([{ kind: 'added', text: '\n\nOne.\n\nTwo.\n' }])).toEqual([
      { kind: 'added', text: 'One.' },
      { kind: 'same', text: '\n\n' },
      { kind: 'added', text: 'Two.' },
    ])
  })

  it('leaves unchanged words and changes inside a line alone', () => {
    const words = [
      { kind: 'same' as const, text: 'Turn ' },
      { kind: 'removed' as const, text: 'it' },
      { kind: 'added' as const, text: 'the screw' },
      { kind: 'same' as const, text: ' once.' },
    ]
    expect(withoutMarkedGaps(words)).toEqual(words)
  })

  it('has nothing to show for empty lines alone', () => {
    expect(withoutMarkedGaps([{ kind: 'removed', text: '\n\n' }])).toEqual([])
  })
})
