import type { Finding } from './finding'

/** One refused field: where it is and a sentence a person can act on. */
export interface Issue {
  path: string
  message: string
}

/** The `data` of every error answer of the API. Nothing else leaves the server. */
export interface ApiErrorData {
  /** `topic.problem`, stable, for example `input.invalid`. */
  code: string
  message: string
  issues?: Issue[]
  findings?: Finding[]
}
