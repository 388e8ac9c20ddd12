export { title }

const title = 'What “settled” means · Camber & Clay'
