import type { Sheet } from '../../sheet'
import { evaluate } from '../../sheet/estimate'
import type { Reply } from './estimator'

// One sheet in, one reply out; what is thrown is said in words, because a worker's error event has none.
addEventListener('message', ({ data }: MessageEvent<Sheet>) => {
  postMessage(replyTo(data))
})

function replyTo(sheet: Sheet): Reply {
  try {
    return { ok: true, evaluation: evaluate(sheet) }
  } catch (error) {
    return { ok: false, reason: error instanceof Error ? error.message : String(error) }
  }
}
