/** What a parser throws about an expression: words, and the index of the character they are about, from 0. */
export class FormulaProblem extends Error {
  constructor(message: string, readonly at: number) {
    super(message)
    this.name = 'FormulaProblem'
  }
}
