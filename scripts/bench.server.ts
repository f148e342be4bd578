/**
 * A bare node:http server for the benchmark: answers BENCH_ANSWER when it is set, and otherwise does the preview's own
 * computing (parse, check, plan, write) with nothing around it.
 */
import { createServer } from 'node:http'
import { RegimenInput } from '#shared/schemas/regimen'
import { buildPlan } from '#server/utils/plan/buildPlan'
import { currentEdition } from '#server/utils/reference'

const fixed = process.env.BENCH_ANSWER
const edition = currentEdition()

createServer(async (request, response) => {
  const chunks: Buffer[] = []
  for await (const chunk of request) chunks.push(chunk as Buffer)
  const body = Buffer.concat(chunks).toString()
  const answer = fixed ?? (body === '' ? '' : JSON.stringify(buildPlan(RegimenInput.parse(JSON.parse(body)), edition)))
  response.writeHead(200, { 'content-type': 'application/json' }).end(answer)
}).listen(Number(process.env.PORT), '127.0.0.1')
