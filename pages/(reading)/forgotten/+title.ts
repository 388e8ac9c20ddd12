export { title }

const title = 'Set a new password · Camber & Clay'
