/** Input that makes no sense: the message names the value and says what was expected. */
export class BadInput extends Error {
  override readonly name = 'BadInput'
}
