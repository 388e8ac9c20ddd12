export { title }

const title = 'Heat reports · Camber & Clay'
