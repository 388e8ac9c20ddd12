export { title }

const title = 'My car · Camber & Clay'
