export { title }

const title = 'Join the book · Camber & Clay'
