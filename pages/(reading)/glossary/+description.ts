export { description }

const description =
  'Every trade word the guides use, A to Z, each in one plain sentence: push, loose, droop, toe-in, anti-squat, bite and the rest, with the standard where one defines it.'
