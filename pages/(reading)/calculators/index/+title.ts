export { title }

const title = 'Every calculator · Camber & Clay'
