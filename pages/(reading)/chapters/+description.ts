export { description }

const description =
  'The eight chapters of the book, A to H: tyres, diffs, wheel angles, springs and shocks, how the car sits, weight, motor and gearing, the bench.'
