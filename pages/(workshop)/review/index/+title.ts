export { title }

const title = 'Review desk · Camber & Clay'
