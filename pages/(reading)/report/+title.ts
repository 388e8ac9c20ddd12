export { title }

const title = 'Did it hold? · Camber & Clay'
