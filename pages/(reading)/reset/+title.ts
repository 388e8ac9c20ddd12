export { title }

const title = 'Your new password · Camber & Clay'
