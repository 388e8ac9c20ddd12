export { title }

const title = 'Sign in · Camber & Clay'
