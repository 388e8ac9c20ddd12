export { title }

const title = 'Mailbox · Camber & Clay'
