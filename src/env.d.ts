declare module '*.vue' {
  import type { DefineComponent } from 'vue'
  const component: DefineComponent<object, object, unknown>
  export default component
}
declare module 'video.js/core' {
  import videojs from 'video.js'
  export default videojs
}
