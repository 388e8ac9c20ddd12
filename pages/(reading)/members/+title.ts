export { title }

const title = 'Members · Camber & Clay'
