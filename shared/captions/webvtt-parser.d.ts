declare module 'webvtt-parser' {
  interface ParsedCue {
    /** In seconds. */
    startTime: number
    endTime: number
    text: string
    id: string
  }
  interface ParsedCaptions {
    cues: ParsedCue[]
    errors: { message: string; line: number; col?: number }[]
  }
  const parser: {
    WebVTTParser: new () => { parse: (text: string, mode: string) => ParsedCaptions }
  }
  export = parser
}
