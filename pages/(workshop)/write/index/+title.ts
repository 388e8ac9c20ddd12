export { title }

const title = 'Write · Camber & Clay'
