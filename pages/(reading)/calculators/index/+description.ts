export { description }

const description =
  'Every calculator of the book, by the part of the car it is about. Each shows its working, its limits and its sources, and works without a script.'
