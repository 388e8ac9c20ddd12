export { title }

const title = 'Your page · Camber & Clay'
