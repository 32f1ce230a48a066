import type { IncomingHttpHeaders } from 'node:http'
import { maxVideoBytes } from '../../shared/contracts/media'
import { refusals } from './uploadRefusals'
import type { UploadPlan } from './uploads.service'

const longestName = 255

/** `lessonId MTI=,filename YS5tcDQ=` as the texts behind it; what cannot be read is left out. */
function readMetadata(header: string): Map<string, string> {
  const pairs = header.split(',').map((pair) => pair.trim().split(' '))
  return new Map(
    pairs.map(([name = '', value = '']) => [name, Buffer.from(value, 'base64').toString('utf8')]),
  )
}

/** A file's name as one line without a path; it is shown to its sender and decides nothing. */
function cleanName(name: string): string {
  const last = name.split(/[\\/]/).at(-1) ?? ''
  return last.replace(/\p{C}/gu, '').trim().slice(0, longestName) || 'video'
}

/** What a tus creation request says of the file to come. */
export function readUploadPlan(headers: IncomingHttpHeaders): UploadPlan {
  const header = headers['upload-metadata']
  const metadata = readMetadata(typeof header === 'string' ? header.slice(0, 8192) : '')
  const lessonId = metadata.get('lessonId') ?? ''
  if (!/^[1-9]\d{0,9}$/.test(lessonId)) throw refusals.noLesson()
  const length = headers['upload-length']
  if (typeof length !== 'string' || !/^[1-9]\d{0,15}$/.test(length)) throw refusals.noLength()
  if (Number(length) > maxVideoBytes) throw refusals.tooLarge()
  return {
    bytes: Number(length),
    lessonId: Number(lessonId),
    filename: cleanName(metadata.get('filename') ?? ''),
  }
}
