/** Input that cannot be used: ends the command with status 2 and nothing written. */
export class Failure extends Error {
  override readonly name = 'Failure'
}

/** Exit statuses of every command. */
export const STATUS = { done: 0, marked: 1, refused: 2, interrupted: 130 } as const
