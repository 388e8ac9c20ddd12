export { description }

const description =
  'Say what the car does wrong, on which ground and how much time there is. You get the changes to try, best first, each with its size, what it costs and why.'
