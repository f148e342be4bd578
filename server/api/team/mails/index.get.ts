import { MailsQuery } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { database, listMails } from '#server/utils/data'
import { readQueryOf } from '#server/utils/http/readInput'

defineRouteMeta({ openAPI: { tags: ['Team'], summary: 'Mails of the team: sent, waiting, failed, kept; their text only in the demonstration', parameters: [{ in: 'query', name: 'page' }, { in: 'query', name: 'pageSize' }, { in: 'query', name: 'sort' }, { in: 'query', name: 'q' }, { in: 'query', name: 'state' }], responses: { 200: { description: 'Page of MailRow' }, 403: { description: 'Only coordinators' } } } })

export default defineEventHandler(async (event) => {
  const { teamId, team } = await requireMember(event, 'mail.see')
  return listMails(database(), teamId, team.demo, readQueryOf(event, MailsQuery))
})
