export { InstrumentMark, instrumentMarks }

import { h, type FunctionalComponent } from 'vue'

/**
 * The five marks of an instrument. All forty of renderer/icons/marks.ts would travel with every calculator,
 * for a kilobyte of drawings it does not show; a test keeps these the same as those.
 */
const instrumentMarks = {
  plus: 'M12 4v16M4 12h16',
  minus: 'M4 12h16',
  cross: 'M5 5l14 14M19 5L5 19',
  link: 'M10 14a4 4 0 0 0 6 0.4l3-3a4 4 0 0 0-5.7-5.7L12 7M14 10a4 4 0 0 0-6-0.4l-3 3A4 4 0 0 0 10.7 18.3L12 17',
  tag: 'M8 5h13v14H8L2 12zM7 12a1.5 1.5 0 1 0 3 0a1.5 1.5 0 1 0 -3 0z',
}

/** A mark beside words; it says nothing to a screen reader. */
const InstrumentMark: FunctionalComponent<{ name: keyof typeof instrumentMarks; small?: boolean }> = ({
  name,
  small,
}) =>
  h(
    'svg',
    { class: small ? 'mk mk-s' : 'mk', viewBox: '0 0 24 24', 'aria-hidden': 'true' },
    h('path', { d: instrumentMarks[name] }),
  )
InstrumentMark.props = ['name', 'small']
