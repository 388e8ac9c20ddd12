export { calculator }

import { carRanges } from '#shared/cars/car-ranges.ts'
import { changeInWords } from '../common/change-in-words.ts'
import { defineCalculator, type CalculatorInput, type FieldMessage } from '../definition.ts'
import { figure, mainFigure, say } from '../sentence.ts'
import { finalDrive, rollout } from './drive.ts'
import { gearingCautions } from './cautions.ts'
import { neighbourTable } from './neighbours.ts'
import { gearingWorking } from './working.ts'

const smallest = { spurTeeth: 10, pinionTeeth: 5 }

const teeth = <const Key extends 'spurTeeth' | 'pinionTeeth' | 'ringTeeth' | 'diffPinionTeeth'>(
  key: Key,
  label: string,
  standard: number,
  [min, max]: readonly [number, number],
  help: string,
): CalculatorInput<Key> => ({
  key,
  label,
  help,
  min,
  max,
  unit: '1',
  default: standard,
  step: 1,
  whole: true,
  reason: 'no gear of a model car has fewer or more',
  carKey: key,
})

const calculator = defineCalculator({
  slug: 'gearing',
  title: 'What your gearing does',
  purpose:
    'Works out final drive, the distance for each turn of the motor and the speed without load. Use it to choose a pinion for a track, or to keep the gearing when the tyres change.',
  part: 'motor and gearing',
  keywords: [
    'gearing',
    'pinion',
    'spur',
    'final drive',
    'ratio',
    'FDR',
    'rollout',
    'top speed',
    'kV',
    'teeth',
    'motor heat',
  ],
  inputs: [
    teeth('spurTeeth', 'Spur gear', 46, [smallest.spurTeeth, 200], 'Teeth, printed on it or counted.'),
    teeth('pinionTeeth', 'Pinion', 15, [smallest.pinionTeeth, 80], 'Teeth, stamped on its face or counted.'),
    teeth(
      'ringTeeth',
      'Ring gear',
      43,
      [1, 200],
      'Teeth of the large gear on the diff. Without a second step, 1.',
    ),
    teeth(
      'diffPinionTeeth',
      'Diff’s pinion',
      11,
      [1, 100],
      'Teeth of the gear that drives it. Without a second step, 1.',
    ),
    {
      key: 'tyreDiameter',
      label: 'Tyre diameter',
      unit: 'mm',
      default: 115,
      min: 20,
      max: 300,
      step: 1,
      reason: 'no tyre of a model car is smaller or larger',
      help: 'Roll the loaded car one turn of the wheel and divide the distance by 3.1416.',
      carKey: 'tyreDiameter',
    },
    {
      key: 'motorKv',
      label: 'Motor constant kV',
      unit: 'rpm/V',
      default: 2050,
      min: 100,
      max: 20000,
      step: 50,
      reason: 'motors of model cars are wound within that',
      help: 'On the motor’s label: turns a minute for each volt.',
      carKey: 'motorKv',
    },
    {
      key: 'cells',
      label: 'Cells in a row',
      unit: '1',
      default: 4,
      min: carRanges.cells[0],
      max: carRanges.cells[1],
      step: 1,
      whole: true,
      reason: 'no battery of a model car has more cells in a row',
      help: 'The number before the S on the battery’s label.',
      carKey: 'cells',
    },
    {
      key: 'voltsPerCell',
      label: 'Volts a cell',
      unit: 'V',
      default: 3.7,
      min: 1,
      max: 4.5,
      step: 0.1,
      reason: 'no cell in use gives less or more',
      help: '3.7 is the middle of a lithium cell’s charge, 4.2 its top; under load it is less.',
    },
  ],
  outputs: [
    { key: 'finalDriveRatio', label: 'Final drive', unit: '1', digits: 4 },
    { key: 'rollout', label: 'Distance for a motor turn', unit: 'mm/rev', digits: 3 },
    { key: 'motorSpeed', label: 'Motor, no load', unit: 'rpm', digits: 4 },
    { key: 'speed', label: 'Car, no load', unit: 'km/h', digits: 3 },
  ],
  compute(inputs) {
    const distance = rollout(inputs.tyreDiameter, inputs)
    const motorSpeed = inputs.motorKv * inputs.cells * inputs.voltsPerCell
    return {
      finalDriveRatio: finalDrive(inputs),
      rollout: distance,
      motorSpeed,
      speed: (motorSpeed * 60 * distance) / 1e6,
    }
  },
  warnings({ spurTeeth, pinionTeeth, ringTeeth, diffPinionTeeth }, { motorSpeed, speed }) {
    const warnings: FieldMessage[] = []
    if (pinionTeeth >= spurTeeth) {
      warnings.push({
        field: 'pinionTeeth',
        message: say`A pinion with as many teeth as the spur, or more, is in no usual car. Are the two swapped?`,
      })
    }
    if (diffPinionTeeth > ringTeeth) {
      warnings.push({
        field: 'diffPinionTeeth',
        message: say`The diff’s pinion has more teeth than the ring gear. Are the two swapped?`,
      })
    }
    if (motorSpeed > 60_000) {
      warnings.push({
        field: 'motorKv',
        message: say`${figure(motorSpeed, 'rpm')} is more than many motors and bearings stand (common practice). The motor’s maker names its limit.`,
      })
    }
    if (speed > 100) {
      warnings.push({
        field: 'tyreDiameter',
        message: say`At ${figure(speed, 'km/h')} most off-road tyres grow and can leave the rim. Stay below what their maker allows.`,
      })
    }
    return warnings
  },
  answer({ cells, voltsPerCell }, outputs) {
    return {
      says: say`Your final drive is ${mainFigure(outputs.finalDriveRatio, '1', 4)} to 1: each turn of the motor moves the car ${figure(outputs.rollout, 'mm')}.`,
      more: [
        say`Without load, on ${figure(cells * voltsPerCell, 'V')}, the motor would turn at ${figure(outputs.motorSpeed, 'rpm', 4)} and the car run ${figure(outputs.speed, 'km/h')}. On the track it stays well below that: use the number to compare, not to boast.`,
        say`Compare tracks by distance for a motor turn rather than by final drive: it holds when the tyres wear or change.`,
      ],
    }
  },
  working: gearingWorking,
  comparison(inputs, outputs) {
    const more = inputs.pinionTeeth < 80
    const changed = { ...inputs, pinionTeeth: inputs.pinionTeeth + (more ? 1 : -1) }
    const ratio = changed.pinionTeeth / inputs.pinionTeeth
    return {
      says: [
        ...say`One tooth ${more ? 'more' : 'fewer'} on the pinion makes the car `,
        ...changeInWords(
          ratio,
          'longer-legged: that much more speed at the same revs, and that much more load on the motor',
          'shorter-legged: that much less speed at the same revs, and that much less load on the motor',
          'no different',
        ),
        '.',
      ],
      caption: 'If you change the pinion',
      columns: ['Yours', more ? 'One tooth more' : 'One tooth fewer'],
      rows: [
        { label: say`Pinion`, unit: '1', digits: 3, cells: [inputs.pinionTeeth, changed.pinionTeeth] },
        {
          label: say`Final drive`,
          unit: '1',
          digits: 4,
          cells: [outputs.finalDriveRatio, finalDrive(changed)],
        },
        {
          label: say`Distance for a motor turn`,
          unit: 'mm/rev',
          digits: 3,
          cells: [outputs.rollout, outputs.rollout * ratio],
        },
        { label: say`Car, no load`, unit: 'km/h', digits: 3, cells: [outputs.speed, outputs.speed * ratio] },
      ],
    }
  },
  tables: (inputs) => [neighbourTable(inputs, smallest)],
  limits: {
    goodBetween:
      'Final drive and distance hold for any gears. The speeds are those of a motor without load on a battery that does not sag: the most there could be, not what the car will do.',
    howClose:
      'Teeth are exact. A tyre is not: it is a few per cent smaller under load and larger at speed, and the distance follows it. The kV on a label is often some per cent off.',
  },
  sources: [
    {
      text: 'R. S. Khurmi and J. K. Gupta, Theory of Machines, chapter 13: the ratio of a compound train is the product of driven over driving teeth.',
      known: 'Read in a public transcription of its worked examples; the book was not seen.',
    },
    {
      text: 'Speed from motor speed, rolling circumference and ratios, as an engineering reference prints it: v = 0.06 n U/i in km/h.',
      url: 'https://engineersedge.com/mechanics_machines/vehicle_speed_14722.htm',
      known: 'Read.',
    },
    {
      text: 'kV as the turns a minute for each volt of a motor without load.',
      known: 'Common practice on motor labels.',
    },
  ],
  cautions: gearingCautions,
})
