/** Queries of the product against the database of this process. Routes come in through here, never through db/. */
export { database } from '../../db/client'
export * from './attemptRows'
export * from './auditRows'
export * from './linkRows'
export * from './logRows'
export * from './peopleRows'
export * from './regimenRows'
export * from './writing'
