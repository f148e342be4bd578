/** What `npm run audit:verify` needs of the product. */
export { openDatabase } from '#server/db/client'
export { verifyChain } from '#server/utils/data/auditRows'
