export { title }

const title = 'Camber & Clay: what to change on an off-road R/C car'
