import { once } from 'node:events'
import type { AddressInfo } from 'node:net'
import { SMTPServer, type SMTPServerOptions } from 'smtp-server'

export interface Received { from: string, to: string[], raw: string }

/** An answer of the mail server that is not "yes". */
export function refusal(responseCode: number, message: string): Error {
  return Object.assign(new Error(message), { responseCode })
}

export interface Postbox { port: number, url: string, received: Received[], /** Asked for each address; null takes it. */ decide: (address: string, asked: number) => Error | null, asked: () => number, close: () => Promise<void> }

/** A mail server of this computer that keeps what it gets. */
export async function openPostbox(options: SMTPServerOptions & { atPort?: number } = {}): Promise<Postbox> {
  let asked = 0
  const received: Received[] = []
  const server = new SMTPServer({
    authOptional: true, hideSTARTTLS: true, logger: false, closeTimeout: 100, disableReverseLookup: true,
    onRcptTo(address, _session, done) {
      asked += 1
      const refused = postbox.decide(address.address, asked)
      if (refused) done(refused)
      else done()
    },
    onData(stream, session, done) {
      const parts: Buffer[] = []
      stream.on('data', (part: Buffer) => parts.push(part))
      stream.on('end', () => {
        const from = session.envelope.mailFrom
        received.push({ from: from ? from.address : '', to: session.envelope.rcptTo.map(one => one.address), raw: Buffer.concat(parts).toString('utf8') })
        done()
      })
    },
    ...options,
  })
  // A client that hangs up is an event of the server, not a failed test.
  server.on('error', () => {})
  const listening = server.listen(options.atPort ?? 0, '127.0.0.1')
  await once(listening, 'listening')
  const { port } = listening.address() as AddressInfo
  const postbox: Postbox = { port, url: `smtp://127.0.0.1:${port}`, received, decide: () => null, asked: () => asked, close: () => new Promise(resolve => server.close(() => resolve())) }
  return postbox
}

/** A port where nobody listens. */
export async function closedPort(): Promise<number> {
  const postbox = await openPostbox()
  await postbox.close()
  return postbox.port
}

export interface ReadMail { headers: Record<string, string>, /** Every header line, unfolded, in order. */ headerLines: string[], text: string, html: string }

/** Reads a mail as a mail program would: headers unfolded and decoded, both parts decoded. */
export function readMail(raw: string): ReadMail {
  const { headers, lines, body } = splitPart(raw)
  const boundary = /boundary="?([^";]+)"?/.exec(headers['content-type'] ?? '')?.[1]
  if (!boundary) throw new Error('The mail has one part only.')
  const parts = body.split(`--${boundary}`).slice(1, -1).map(part => splitPart(part.replace(/^\r\n/, '')))
  const of = (type: string) => {
    const part = parts.find(one => one.headers['content-type']?.startsWith(type))
    if (!part) throw new Error(`The mail has no part of type ${type}.`)
    return decoded(part.body, part.headers['content-transfer-encoding'] ?? '7bit')
  }
  return { headers, headerLines: lines, text: of('text/plain'), html: of('text/html') }
}

function splitPart(raw: string) {
  const at = raw.indexOf('\r\n\r\n')
  const lines = raw.slice(0, at).replace(/\r\n[ \t]+/g, ' ').split('\r\n').filter(Boolean)
  const headers = Object.fromEntries(lines.map(line => [line.slice(0, line.indexOf(':')).toLowerCase(), words(line.slice(line.indexOf(':') + 1).trim())]))
  return { headers, lines, body: raw.slice(at + 4) }
}

function decoded(body: string, encoding: string): string {
  if (encoding === 'base64') return Buffer.from(body, 'base64').toString('utf8')
  if (encoding === 'quoted-printable') return fromQuoted(body.replace(/=\r\n/g, '')).replace(/\r\n/g, '\n')
  return body.replace(/\r\n/g, '\n')
}

function fromQuoted(text: string): string {
  return Buffer.from(text.replace(/=([\dA-F]{2})/gi, (_, hex: string) => String.fromCharCode(Number.parseInt(hex, 16))), 'latin1').toString('utf8')
}

/** Encoded words of a header. */
function words(value: string): string {
  return value.replace(/\?=\s+=\?/g, '?==?').replace(/=\?utf-8\?([bq])\?([^?]*)\?=/gi, (_, way: string, text: string) => way.toLowerCase() === 'b' ? Buffer.from(text, 'base64').toString('utf8') : fromQuoted(text.replace(/_/g, ' ')))
}
