/** Languages a caption file is likely to be in, by BCP 47 code, each by its own name. */
export const languageChoices = [
  { value: 'en', label: 'English' },
  { value: 'cy', label: 'Cymraeg' },
  { value: 'da', label: 'Dansk' },
  { value: 'de', label: 'Deutsch' },
  { value: 'es', label: 'Español' },
  { value: 'fr', label: 'Français' },
  { value: 'ga', label: 'Gaeilge' },
  { value: 'it', label: 'Italiano' },
  { value: 'nl', label: 'Nederlands' },
  { value: 'nb', label: 'Norsk bokmål' },
  { value: 'pl', label: 'Polski' },
  { value: 'pt', label: 'Português' },
  { value: 'fi', label: 'Suomi' },
  { value: 'sv', label: 'Svenska' },
  { value: 'tr', label: 'Türkçe' },
  { value: 'cs', label: 'Čeština' },
  { value: 'uk', label: 'Українська' },
] as const

export const otherLanguage = 'other'
