export { title }

const title = 'Glossary · Camber & Clay'
