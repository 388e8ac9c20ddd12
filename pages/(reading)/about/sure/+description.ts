export { description }

const description =
  'How sure the book is of an effect: what settled, leaning, split and thin mean, how reports are counted, and what the marks physics, common practice and reported stand for.'
