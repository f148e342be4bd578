/** Queries of the product against the database of this process. Routes come in through here, never through db/. */
export { database } from '../../db/client'
export * from './regimenRows'
