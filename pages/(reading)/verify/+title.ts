export { title }

const title = 'Confirm your address · Camber & Clay'
