export { currentPlot }

import { roundedUp } from '../common/plot-window.ts'
import { sampled, type PlotSpec } from '../plot.ts'
import { figure, say } from '../sentence.ts'
import { minutesAt } from './pack.ts'

type Inputs = Record<'capacity' | 'usableShare' | 'averageCurrent', number>

/** Run time against average current, for the share that is driven and for the whole pack. */
function currentPlot(
  { capacity, usableShare, averageCurrent }: Inputs,
  { runTime }: { runTime: number },
): PlotSpec {
  const most = roundedUp(averageCurrent * 2)
  const least = most / 10
  const top = roundedUp(minutesAt(capacity, 100, averageCurrent) * 2)
  // A curve rises without end towards no current; only what is inside the picture is drawn.
  const curve = (share: number) =>
    sampled(least, most, (current) => minutesAt(capacity, share, current), 60).filter(
      ([, minutes]) => minutes <= top,
    )
  return {
    alternative: say`Run time against average current, falling ever more slowly from ${figure(minutesAt(capacity, usableShare, least), 'min')} at ${figure(least, 'A')} to ${figure(minutesAt(capacity, usableShare, most), 'min')} at ${figure(most, 'A')}. Yours is ${figure(runTime, 'min')} at ${figure(averageCurrent, 'A')}.`,
    x: { label: 'average current', unit: 'A', min: 0, max: most, scale: 'linear' },
    y: { label: 'run time', unit: 'min', min: 0, max: top, scale: 'linear' },
    lines: [
      ...(usableShare < 100 ? [{ kind: 'other' as const, label: say`empty`, points: curve(100) }] : []),
      { kind: 'main', label: [], points: curve(usableShare) },
    ],
    points: [
      {
        x: averageCurrent,
        y: runTime,
        label: say`${figure(runTime, 'min')} at ${figure(averageCurrent, 'A')}`,
      },
    ],
  }
}
