import type { QuestionSeed } from '../shapes'

export const questions: QuestionSeed[] = [
  {
    lesson: 'reading-your-ground',
    at: { afterCue: 2 },
    by: 'callum',
    on: '2026-06-06T15:20:00Z',
    title: 'The locating service marked a line right through my best spot. Move the store?',
    markdown:
      'Yellow paint, straight across the corner where the pad would go. The paint says nothing about depth. Could I pour over it if I only dig a spade deep?',
    answers: [
      {
        by: 'petra',
        on: '2026-06-06T17:02:00Z',
        markdown:
          'Move the store. The mark is a guess to a hand or two either side, and **depth is not promised by anyone**. Over the line you may hit it today, and whoever has to mend it later will break your pad.',
      },
      {
        by: 'maren',
        on: '2026-06-07T06:05:00Z',
        markdown:
          'Petra is right. Ask the owner of the line what distance they want kept; that distance goes for your digging as well as for the pad. Inside it, digging is by hand only and by their rules.\n\nIf the only free spot is over a line, this is not the sheet for it.',
      },
    ],
    settled: { answer: 1, by: 'callum', on: '2026-06-07T13:30:00Z' },
  },
  {
    lesson: 'reading-your-ground',
    at: null,
    by: 'bram',
    on: '2026-06-14T19:12:00Z',
    title: 'My water table is a spade below the grass. Does a pad make sense at all?',
    markdown:
      'In November I can see water in the trial hole. In June it is dry to the elbow. The ground is peat with a bit of sand.',
    answers: [
      {
        by: 'maren',
        on: '2026-06-15T05:50:00Z',
        markdown:
          'Not this pad. Peat keeps settling under anything heavy, and wet ground that freezes lifts a thin pad. The sheet says so under “not covered”.\n\nAsk at the building department what people put under small stores where you live; somebody local knows the answer that works there. A light store on bearers that can be re-levelled each spring is often it.',
      },
      {
        by: 'bram',
        on: '2026-06-15T18:44:00Z',
        markdown:
          'Thanks. They said the same and named a depth I am not going to dig. I will watch the rest for the roof and build on bearers.',
      },
    ],
    settled: { answer: 0, by: 'bram', on: '2026-06-15T18:46:00Z' },
  },
  {
    lesson: 'setting-out-the-corner',
    at: { afterCue: 8 },
    by: 'meilin',
    on: '2026-07-01T16:25:00Z',
    title: 'My tape is in feet and inches. Is 3-4-5 still the way?',
    markdown: 'Nothing on my tape is a round 300. Do I convert everything?',
    answers: [
      {
        by: 'callum',
        on: '2026-07-01T18:01:00Z',
        markdown:
          'No converting. Three feet, four feet, five feet. On my pad the short side was not long enough for three feet clear, so I went with a unit of 11 inches: 33, 44 and 55.',
      },
      {
        by: 'sunil',
        on: '2026-07-01T19:14:00Z',
        markdown:
          'Any unit does as long as all three sides use the same one. The bigger it is, the less a sloppy mark matters. Switch the page to feet and inches under your name and the workbench asks in yours.',
      },
    ],
    settled: { answer: 1, by: 'meilin', on: '2026-07-02T15:40:00Z' },
  },
  {
    lesson: 'setting-out-the-corner',
    at: { afterCue: 11 },
    by: 'jo',
    on: '2026-09-19T16:48:00Z',
    title: 'The tape keeps reading 4 mm different when I measure again. Which one is true?',
    markdown:
      'Same two nails, same tape. First 1250, then 1254, then 1251. I have not moved anything.',
    answers: [
      {
        by: 'anke',
        on: '2026-09-19T18:20:00Z',
        markdown:
          'I had that until I held the tape off the grass. Once it hangs straight it repeats.',
      },
      {
        by: 'sunil',
        on: '2026-09-19T19:35:00Z',
        markdown:
          'Three things to rule out, in this order:\n\n1. the hook: start at the 100 mark instead and take 100 off,\n2. the sag: both ends at the same height, nothing in between,\n3. the pull: about as hard as you would pull a door shut, every time.\n\nIf it repeats within 2 mm after that, take the middle and go on. The diagonals will find what is left.',
      },
    ],
  },
  {
    lesson: 'stone-and-form-boards',
    at: { afterCue: 9 },
    by: 'noor',
    on: '2026-08-22T06:31:00Z',
    title: 'Can I use the rubble from an old path instead of crushed stone?',
    markdown: 'There is half a ton of broken concrete and brick behind the shed.',
    answers: [
      {
        by: 'petra',
        on: '2026-08-22T08:15:00Z',
        markdown:
          'Only what is clean and broken small, fist size at most, with finer stone tamped into the gaps, or it leaves hollows. Soft brick crumbles with frost, plaster and wood do not belong in it at all.\n\nBreaking it up is dusty work: **mask rated for silica**, eyes, and wet it first. For a pad this size, bought stone is the shorter day. And if the path could be older than you: some old boards and pipes hold asbestos. Do not break those; ask your council how they are taken away.',
      },
    ],
    settled: { answer: 0, by: 'noor', on: '2026-08-22T14:09:00Z' },
  },
  {
    lesson: 'stone-and-form-boards',
    at: { afterCue: 14 },
    by: 'callum',
    on: '2026-06-13T21:40:00Z',
    title: 'Do I need mesh in a pad this size?',
    markdown: '',
    answers: [
      {
        by: 'maren',
        on: '2026-06-14T05:44:00Z',
        markdown:
          'This sheet does without: 100 mm (4 in) on well tamped stone, and nothing heavier on it than firewood. Your local code may ask for mesh, and then it wins.\n\nMesh does not carry a pad over soft ground. It only keeps a crack closed, and only if it sits in the concrete and not on the stone under it.',
      },
    ],
    settled: { answer: 0, by: 'callum', on: '2026-06-14T12:12:00Z' },
  },
  {
    lesson: 'squaring-the-form',
    at: { afterCue: 4 },
    by: 'anke',
    on: '2026-05-17T15:22:00Z',
    title: 'Do I measure to the inside or the outside of the boards?',
    markdown: 'I went outside to outside, and my pad would come out a board too small each way.',
    answers: [
      {
        by: 'sunil',
        on: '2026-05-17T15:31:00Z',
        markdown: 'Inside. I learned it the same way.',
      },
      {
        by: 'maren',
        on: '2026-05-17T15:40:00Z',
        markdown:
          'Inside faces. The concrete touches the inside, so that is the size that counts. Put the hook of the tape on a nail at the inside corner.',
      },
    ],
    settled: { answer: 1, by: 'anke', on: '2026-05-17T15:52:00Z' },
  },
  {
    lesson: 'squaring-the-form',
    at: { stop: 'three-four-five' },
    by: 'tomas',
    on: '2026-07-19T17:05:00Z',
    title: 'My short side is only 700. Is a smaller triangle good enough?',
    markdown: 'Three units of 300 do not fit. With 200 the legs are 600 and 800.',
    answers: [
      {
        by: 'anke',
        on: '2026-07-19T18:40:00Z',
        markdown: 'I used 200 on the little step beside mine and the diagonals still agreed.',
      },
      {
        by: 'sunil',
        on: '2026-07-19T19:02:00Z',
        markdown:
          'It is good enough to start from. A slip of 1 mm at the mark turns the corner more on a small triangle than on a big one, so let the diagonals have the last word: inside corner to inside corner, the same within 3 mm.',
      },
    ],
  },
  {
    lesson: 'squaring-the-form',
    at: { afterCue: 15 },
    by: 'callum',
    on: '2026-06-20T20:18:00Z',
    title: 'Both diagonals agree but neither is what the sum says. Is it square?',
    markdown:
      'Mine read 9′ 3-3/8″ both ways. By the sum they should be 9′ 3-1/8″. Do I start over?',
    answers: [
      {
        by: 'petra',
        on: '2026-06-20T21:02:00Z',
        markdown:
          'It is square: equal diagonals in a form whose opposite sides are equal say so. It is only a touch bigger than drawn. Check that the two long boards measure the same, and the two short ones; if so, leave it. The posts go by the pad you have, not by the one on paper.',
      },
      {
        by: 'callum',
        on: '2026-06-21T11:37:00Z',
        markdown:
          'Both long boards are 1/4″ longer than I had cut them in my head, and the short ones match. Leaving it. Thanks.',
      },
    ],
    settled: { answer: 0, by: 'petra', on: '2026-06-21T12:00:00Z' },
  },
  {
    lesson: 'mixing-and-pouring',
    at: { afterCue: 10 },
    by: 'anke',
    on: '2026-05-31T06:40:00Z',
    title: 'A hairline runs across my pad on day two. Do I break it out?',
    markdown:
      'It starts in the middle of the back edge and runs to the front. I can see it but not get a fingernail into it. I kept the sheet on for one night only.',
    answers: [
      {
        by: 'petra',
        on: '2026-05-31T07:05:00Z',
        markdown: 'Mine did the same in the first warm week and has not moved since.',
      },
      {
        by: 'maren',
        on: '2026-05-31T07:20:00Z',
        markdown:
          'No. A line you cannot get a fingernail into is drying, not breaking: the top lost water faster than the rest. Wet it, cover it, keep it covered for a week.\n\nIf one side stands higher than the other, that is different: the ground moved. Write again with a picture.',
        editedOn: '2026-05-31T07:26:00Z',
      },
    ],
    settled: { answer: 1, by: 'anke', on: '2026-06-02T18:15:00Z' },
  },
  {
    lesson: 'mixing-and-pouring',
    at: { afterCue: 6 },
    by: 'callum',
    on: '2026-06-27T16:12:00Z',
    title: 'Rain in an hour and ten bags to go. Stop or finish?',
    markdown: 'Eighteen are in, the sky is black to the west.',
    answers: [
      {
        by: 'sunil',
        on: '2026-06-27T16:21:00Z',
        markdown:
          'Stop. Strike off what is in, end it upright against a board, cover it with a sheet on battens so that it does not touch, weigh the edges down. Rain on fresh concrete washes the cement out of the top, and tired people in a hurry get it in their boots.\n\nFinish against that edge when it is dry. The joint shows, and it is sound.',
      },
      {
        by: 'callum',
        on: '2026-06-28T13:02:00Z',
        markdown: 'Stopped. It came down like a bucket. The covered half looks like yours.',
      },
    ],
    settled: { answer: 0, by: 'callum', on: '2026-06-28T13:04:00Z' },
  },
  {
    lesson: 'mixing-and-pouring',
    at: { afterCue: 3 },
    by: 'noor',
    on: '2026-09-05T07:18:00Z',
    title: 'The bags have been open in the shed for a month. Still good?',
    markdown: 'No lumps that I can see, but the paper feels damp.',
    answers: [
      {
        by: 'maren',
        on: '2026-09-05T08:02:00Z',
        markdown:
          'Damp paper means the cement has begun without you. Lumps that do not fall to powder between two fingers: not for anything that has to hold. I would not pour a pad with them even without lumps; use fresh bags, and check the date printed on them.\n\nThe old ones go where your council takes building waste. Mask on when you move them.',
      },
    ],
  },
  {
    lesson: 'posts-and-their-feet',
    at: { afterCue: 5 },
    by: 'anke',
    on: '2026-06-08T17:50:00Z',
    title: 'Resin or expanding anchor in a pad this thin?',
    markdown: 'The pad is 100 mm and the foot plate is close to the corner.',
    answers: [
      {
        by: 'petra',
        on: '2026-06-08T18:33:00Z',
        markdown:
          'An expanding anchor pushes outwards, which is what a corner likes least. A resin anchor does not push, so its sheet usually allows it nearer the edge.\n\nBut read the sheet of the one you hold: least thickness of concrete, hole depth, edge distance, and how the hole is cleaned. If it asks for more than your pad has, move the post in or take another anchor. Dust from the hole: mask and vacuum, never your breath.',
      },
      {
        by: 'maren',
        on: '2026-06-09T05:51:00Z',
        markdown:
          'What Petra says. And wait for the resin’s own hardening time before you hang a post on it; it is longer on a cold morning.',
      },
    ],
    settled: { answer: 0, by: 'anke', on: '2026-06-09T16:20:00Z' },
  },
  {
    lesson: 'slats-with-even-gaps',
    at: { afterCue: 5 },
    by: 'anke',
    on: '2026-06-21T10:14:00Z',
    title: 'My slats came wet. Do I leave them a smaller gap?',
    markdown: 'They are treated and heavy, and measure 97 where the sheet says 95.',
    answers: [
      {
        by: 'sunil',
        on: '2026-06-21T11:05:00Z',
        markdown:
          'Yes, if you care how the gap looks next summer: they shrink across, not along. Two millimetres less now comes to about the drawn gap when they are dry. The store itself does not mind either way; wind gets through.',
      },
    ],
    settled: { answer: 0, by: 'anke', on: '2026-06-21T18:30:00Z' },
  },
  {
    lesson: 'the-roof-and-its-pitch',
    at: { afterCue: 9 },
    by: 'bram',
    on: '2026-07-12T18:55:00Z',
    title: 'Can the roof fall to the back instead, towards my hedge?',
    markdown: 'In front is the path, and I do not want a curtain of water on it.',
    answers: [
      {
        by: 'maren',
        on: '2026-07-13T05:47:00Z',
        markdown:
          'It can: swap front and back posts, and let the pad fall to the back as well. Keep the drip clear of the pad, and keep the water on your own ground; many local codes say where roof water may go, and a neighbour’s side of the hedge is not it.\n\nYou lose headroom where you load, so stand under the low side once before you cut.',
      },
    ],
  },
  {
    lesson: 'cut-ends-and-first-stack',
    at: { afterCue: 12 },
    by: 'callum',
    on: '2026-11-21T15:33:00Z',
    title: 'Is one coat of end-grain preserver enough under the feet?',
    markdown: 'Watching ahead while it is raining. The tin says “one to three”.',
    answers: [],
  },
]
