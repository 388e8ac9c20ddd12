export { temperaturePlot }

import { bottlesAround } from '../common/silicone-fluids.ts'
import { sampled, type PlotSpec } from '../plot.ts'
import { figure, say } from '../sentence.ts'
import { viscosityAt } from './viscosity.ts'

type Inputs = Record<'viscosityAt25' | 'referenceTemperature' | 'temperature', number>

/** Thickness against temperature for the reader's fluid and the bottles on either side of it. */
function temperaturePlot(
  { viscosityAt25, referenceTemperature, temperature }: Inputs,
  { viscosity }: { viscosity: number },
): PlotSpec {
  const coldest = Math.min(referenceTemperature, temperature) < 0 ? -25 : 0
  const hottest = 100
  const { below, above } = bottlesAround(viscosityAt25)
  const neighbours = [below, above].filter((bottle) => bottle !== undefined)
  const fluids = [viscosityAt25, ...neighbours]
  const curve = (fluid: number) => sampled(coldest, hottest, (degrees) => viscosityAt(fluid, degrees))
  return {
    alternative: say`Thickness against temperature from ${figure(coldest, '°C')} to ${figure(hottest, '°C')}, falling all the way. At ${figure(temperature, '°C')} the ${figure(viscosityAt25, 'cSt', 9)} fluid acts like about ${figure(viscosity, 'cSt')}.`,
    x: { label: 'temperature', unit: '°C', min: coldest, max: hottest, scale: 'linear' },
    y: {
      label: 'thickness',
      unit: 'cSt',
      scale: 'log',
      // Room below the curves, so that their names stay clear of the numbers of the axis.
      min: 0.8 * viscosityAt(Math.min(...fluids), hottest),
      max: viscosityAt(Math.max(...fluids), coldest),
    },
    lines: [
      ...neighbours.map((fluid) => ({
        kind: 'other' as const,
        label: say`${figure(fluid, 'cSt', 9)}`,
        points: curve(fluid),
      })),
      { kind: 'main', label: say`${figure(viscosityAt25, 'cSt', 4)}`, points: curve(viscosityAt25) },
    ],
    points: [
      {
        x: temperature,
        y: viscosity,
        label: say`${figure(viscosity, 'cSt')}`,
      },
    ],
  }
}
