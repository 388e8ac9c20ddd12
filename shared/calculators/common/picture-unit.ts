export { pictureUnit }

/**
 * How long one unit of text is in a drawing that is `across` wide: pictures are laid out 336 units wide, and
 * letters keep their size while the frame of a drawing grows. For placing labels beside what they name.
 */
function pictureUnit(across: number): number {
  return across / 336
}
