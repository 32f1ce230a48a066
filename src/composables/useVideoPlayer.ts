import { onBeforeUnmount, ref, shallowRef, watch, type Ref } from 'vue'
import type Player from 'video.js/dist/types/player'
import type { Video } from '../../shared/contracts/media'

/** One caption as it is spoken. */
export interface SpokenCue {
  startMs: number
  endMs: number
  text: string
}
interface CueList {
  readonly length: number
  readonly [index: number]: { startTime: number; endTime: number; text?: string } | undefined
}

const plainText = (text: string) =>
  text
    .replace(/<[^>]*>/g, '')
    .replace(/\s+/g, ' ')
    .trim()

/** The player's parts that are used; the lesson page has controls of its own. */
const parts = ['mediaLoader', 'posterImage', 'textTrackDisplay', 'resizeManager']

/** The player without style elements of its own, which the page's security policy refuses. */
async function loadPlayer() {
  Object.assign(window, { VIDEOJS_NO_DYNAMIC_STYLE: true })
  const { default: videojs } = await import('video.js/core')
  return videojs
}

/**
 * Video.js in `container`, which gets a fresh element each time because the player takes its own
 * away when it is disposed of. The clock is read on every frame while it plays.
 */
export function useVideoPlayer(container: Ref<HTMLElement | null>, video: () => Video | null) {
  const player = shallowRef<Player | null>(null)
  const isPlaying = ref(false)
  const positionMs = ref(0)
  const hasFailed = ref(false)
  const hasCaptions = ref(false)
  const areCaptionsOn = ref(true)
  const speed = ref(1)
  /** Counts the jumps over the tape. */
  const jumps = ref(0)
  const cues = shallowRef<SpokenCue[]>([])
  let frame = 0
  let isGone = false
  /** Play was pressed before the player had come. */
  let isAwaited = false

  function readClock() {
    const seconds = player.value?.currentTime()
    if (seconds !== undefined) positionMs.value = seconds * 1000
  }
  function tick() {
    readClock()
    frame = requestAnimationFrame(tick)
  }
  function readCues() {
    const track = player.value?.textTracks() as unknown as { [0]?: { cues: CueList | null } }
    const list = track[0]?.cues
    if (!list || list.length === cues.value.length) return
    cues.value = Array.from(list as unknown as ArrayLike<CueList[number]>, (cue) => ({
      startMs: (cue?.startTime ?? 0) * 1000,
      endMs: (cue?.endTime ?? 0) * 1000,
      text: plainText(cue?.text ?? ''),
    }))
  }
  function applyCaptions() {
    const tracks = player.value?.textTracks() as unknown as
      { length: number; [index: number]: { mode: string } } | undefined
    for (let index = 0; index < (tracks?.length ?? 0); index++) {
      const track = tracks?.[index]
      if (track) track.mode = index === 0 && areCaptionsOn.value ? 'showing' : 'hidden'
    }
  }

  async function start(source: Video, startMs: number) {
    const videojs = await loadPlayer()
    if (isGone || !container.value) return
    stop()
    const element = document.createElement('video-js')
    container.value.replaceChildren(element)
    const made = videojs(element, {
      controls: false,
      children: parts,
      preload: 'auto',
      fill: true,
      playsinline: true,
      poster: source.posterUrl ?? '',
      userActions: { hotkeys: false, click: false, doubleClick: false },
      sources: [{ src: source.src, type: source.contentType }],
      tracks: source.captions.map((track) => ({
        kind: 'captions',
        src: track.src,
        srclang: track.language,
        label: track.label,
        default: track.isOriginal,
      })),
    })
    player.value = made
    hasCaptions.value = source.captions.length > 0
    made.on('loadedmetadata', () => {
      if (startMs > 0) made.currentTime(startMs / 1000)
      applyCaptions()
    })
    made.on('play', () => {
      isPlaying.value = true
      cancelAnimationFrame(frame)
      frame = requestAnimationFrame(tick)
    })
    made.on(['pause', 'ended'], () => {
      isPlaying.value = false
      cancelAnimationFrame(frame)
      readClock()
    })
    made.on(['seeked', 'timeupdate'], () => {
      readClock()
      readCues()
    })
    made.on('error', () => (hasFailed.value = true))
    made.on('playerresize', layCaptions)
    made.textTracks().on('change', readCues)
    made.on('texttrackchange', readCues)
    made.on('loadeddata', readCues)
    if (isAwaited) void play()
  }
  function stop() {
    cancelAnimationFrame(frame)
    player.value?.dispose()
    player.value = null
    isPlaying.value = false
    hasFailed.value = false
    cues.value = []
  }

  /** The captions are laid out for one size of the picture; another size needs them anew. */
  function layCaptions() {
    const made = player.value
    if (!made) return
    const display = made.getChild('textTrackDisplay') as { updateDisplay: () => void } | undefined
    const tracks = made.textTracks() as unknown as ArrayLike<{
      activeCues: ArrayLike<{ hasBeenReset?: boolean }> | null
    }>
    for (const { activeCues } of Array.from(tracks)) {
      for (const cue of Array.from(activeCues ?? [])) cue.hasBeenReset = true
    }
    display?.updateDisplay()
  }
  function seek(atMs: number) {
    jumps.value++
    positionMs.value = atMs
    player.value?.currentTime(atMs / 1000)
  }
  async function play() {
    isAwaited = player.value === null
    await Promise.resolve(player.value?.play()).catch(() => undefined)
  }
  function pause() {
    isAwaited = false
    player.value?.pause()
  }
  function setSpeed(value: number) {
    speed.value = value
    player.value?.playbackRate(value)
  }
  async function toggleFullScreen() {
    const made = player.value
    if (!made) return
    if (made.isFullscreen()) await made.exitFullscreen()
    else await made.requestFullscreen()
  }
  watch(areCaptionsOn, applyCaptions)
  watch(video, (source) => {
    if (source && player.value) void start(source, positionMs.value)
  })
  onBeforeUnmount(() => {
    isGone = true
    stop()
  })

  return {
    isPlaying,
    positionMs,
    hasFailed,
    hasCaptions,
    areCaptionsOn,
    speed,
    jumps,
    cues,
    start,
    seek,
    play,
    pause,
    setSpeed,
    toggleFullScreen,
    exitFullScreen: () => {
      if (player.value?.isFullscreen()) void player.value.exitFullscreen()
    },
  }
}
