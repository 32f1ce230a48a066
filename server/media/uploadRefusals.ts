import { maxVideoBytes } from '../../shared/contracts/media'
import { AppError, invalid, notFound } from '../errors'

const largest = `${maxVideoBytes / 1024 ** 3} GiB`

/** Everything an upload can be refused for, in sentences. */
export const refusals = {
  diskFull: () =>
    new AppError(
      507,
      'disk-full',
      'There is no room for this file on the server just now. What has come in is kept; try again later, or tell the office.',
    ),
  tooMany: (most: number) =>
    new AppError(
      429,
      'too-many',
      `You are sending ${most} videos at once. Wait until one of them is in.`,
    ),
  otherVersion: () =>
    new AppError(412, 'tus-version', 'This server speaks version 1.0.0 of the tus protocol only.'),
  notBytes: () =>
    new AppError(
      415,
      'not-bytes',
      'Send the bytes of the file as application/offset+octet-stream.',
    ),
  noLesson: () =>
    invalid([{ field: 'Upload-Metadata.lessonId', message: 'Say which lesson the video is for.' }]),
  noLength: () =>
    invalid([
      {
        field: 'Upload-Length',
        message: 'Say how long the file is, in bytes, and more than none.',
      },
    ]),
  noOffset: () =>
    invalid([{ field: 'Upload-Offset', message: 'Say at which byte this part begins.' }]),
  tooLarge: () => new AppError(413, 'too-large', `A video may have at most ${largest}.`),
}

/** A refusal by the tus library as one of ours. */
export function toRefusal(status: number): AppError {
  if (status === 404 || status === 410) return notFound('upload')
  if (status === 409) {
    return new AppError(
      409,
      'other-offset',
      'The server holds another amount of this file. Ask how much it has and go on from there.',
    )
  }
  if (status === 413) {
    return new AppError(413, 'too-large', 'This is more than the file was said to have.')
  }
  if (status === 507) return refusals.diskFull()
  if (status >= 500) {
    return new AppError(503, 'not-received', 'The file could not be received just now. Try again.')
  }
  return new AppError(status, 'bad-upload', 'This part of the upload cannot be read. Try again.')
}
