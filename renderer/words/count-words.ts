export { counted, numberWord, capital }

const words = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten', 'eleven', 'twelve']

/** Small counts read as words in running text: “three”; larger ones as figures. */
function numberWord(count: number): string {
  return words[count] ?? count.toLocaleString('en-GB')
}

/** “one guide”, “three guides”, “no guides”. */
function counted(count: number, one: string, many = `${one}s`): string {
  return `${numberWord(count)} ${count === 1 ? one : many}`
}

/** First letter large, for the start of a sentence. */
function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1)
}
