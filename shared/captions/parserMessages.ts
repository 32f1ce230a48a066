/** What the parser says, and what we say instead: what is wrong, and what to do. */
const sentences: [begins: string, says: string][] = [
  [
    'No valid signature',
    'The first line has to be WEBVTT. Write it above everything else, with a blank line after it.',
  ],
  ['No blank line after the signature', 'Leave a blank line between WEBVTT and this line.'],
  [
    'Cannot have timestamp in a comment',
    'A comment cannot hold an arrow (-->). Leave a blank line before the caption that follows it.',
  ],
  [
    'Cannot have timestamp in a style block',
    'A style block cannot hold an arrow (-->). Leave a blank line before the caption that follows it.',
  ],
  [
    'Style blocks cannot appear after the first cue',
    'Styles belong above the first caption. Move this block up, or take it out.',
  ],
  [
    'Cue identifier cannot be standalone',
    'This line stands alone. Write the times of its caption below it, or take the line out.',
  ],
  [
    'Cue identifier needs to be followed by timestamp',
    'Here the times of a caption are expected, as in 00:01.000 --> 00:04.000.',
  ],
  ['Blank line missing before cue', 'Leave a blank line before the times of the next caption.'],
  ['No timestamp found', 'The time is missing. Write it as 00:01.000.'],
  ['Timestamp must start with a character', 'A time begins with a digit. Write it as 00:01.000.'],
  ['No time unit separator found', 'Put a colon between minutes and seconds, as in 00:01.000.'],
  ['Must be exactly two digits', 'Minutes and seconds have two digits each, as in 00:01.000.'],
  [
    'No seconds found or minutes is greater than 59',
    'Minutes end at 59. Write hours before them, as in 01:00:01.000.',
  ],
  [
    'No decimal separator',
    'Put a point before the thousandths of a second, as in 00:01.000; a comma is not read.',
  ],
  [
    'Milliseconds must be given in three digits',
    'Write the thousandths of a second with three digits, as in 00:01.000.',
  ],
  ['You cannot have more than 59 minutes', 'Minutes end at 59. Count on in hours.'],
  ['You cannot have more than 59 seconds', 'Seconds end at 59. Count on in minutes.'],
  [
    'Start timestamp is not greater than or equal',
    'This caption begins before the one above it. Put the captions in the order of their times.',
  ],
  [
    'End timestamp is not greater',
    'This caption ends before it has begun. Put the later time after the arrow.',
  ],
  ['Timestamp not separated from', 'Leave a space between the first time and the arrow (-->).'],
  [
    "'-->' not separated from timestamp",
    'Leave a space between the arrow (-->) and the second time.',
  ],
  ['No valid timestamp separator', 'Put an arrow between the two times: -->.'],
  ['Timestamp must not have trailing', 'Something stands after the time. Take it out.'],
  ['Duplicate setting', 'This setting stands here twice. Keep one.'],
  ['No value for setting', 'This setting has no value. Write it as align:start, or take it out.'],
  ['Writing direction', 'The setting vertical takes rl or lr.'],
  ['Line alignment', 'The setting line may end in ,start or ,center or ,end.'],
  ['Line position', 'The setting line takes a number of lines or a percentage, as in line:90%.'],
  ['Position alignment', 'The setting position may end in ,line-left or ,center or ,line-right.'],
  ['Text position', 'The setting position takes a percentage, as in position:50%.'],
  ['Size', 'The setting size takes a percentage of at most 100, as in size:80%.'],
  ['Alignment', 'The setting align takes start, center, end, left or right.'],
  [
    'Invalid setting',
    'This setting is not known. Use vertical, line, position, size, align or region, or take it out.',
  ],
  ['Incorrect escape', 'The sign & stands for itself only as &amp;. Write it so, or write “and”.'],
  ['Incorrect start tag', 'After < a tag is expected. Write &lt; for the sign itself.'],
  ['Incorrect end tag', 'This closing tag closes nothing. Take it out.'],
  ['Required end tag missing', 'A tag is opened here and never closed. Close it.'],
  ['Only <v> can have an annotation', 'Only the tags v and lang take words after their name.'],
  [
    'Timestamp must be between start timestamp and end',
    'A time inside a caption has to lie between its beginning and its end.',
  ],
  ['Timestamp must be greater than any previous', 'The times inside a caption have to rise.'],
]

/** A message of the parser in our own words. */
export function sayOwnWords(message: string): string {
  const found = sentences.find(([begins]) => message.startsWith(begins))
  return (
    found?.[1] ?? 'This cannot be read as captions. Compare it with the lines above, and mend it.'
  )
}
