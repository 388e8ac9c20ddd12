export { title }

const title = 'How a guide is approved · Camber & Clay'
