export { title }

const title = 'Chapters · Camber & Clay'
