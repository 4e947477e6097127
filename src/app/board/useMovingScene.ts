import { useEffect, useMemo, useRef } from 'react'
import {
  type Displacement,
  displacementBetween,
  type Item,
  layout,
  type Scene,
  type Theme,
} from '../../drawing'
import type { Place } from '../../sheet'
import { answerOf, usePage } from '../store'
import { formerArrows, greyedOf, type ViewOptions } from './scene'

/** The part of the scene that a drag changes, apart from what stands still. */
export interface MovingScene {
  /** The keys of all arrows that the drag touches. */
  readonly moved: ReadonlySet<string>
  /** The keys of the arrows of the scene before that show what was solved before the drag. */
  readonly former: ReadonlySet<string>
  /** Items drawn anew in each frame. */
  readonly live: readonly Item[]
  /** Items that keep their shape, and how far they have been carried, in millimetres. */
  readonly carried: readonly {
    readonly key: string
    readonly items: readonly Item[]
    readonly by: Place
  }[]
  /** The scene as the draft has it; only the live arrows have items. */
  readonly after: Scene | undefined
}

interface Sorted extends Displacement {
  readonly moved: ReadonlySet<string>
  readonly groups: readonly { readonly key: string; readonly items: readonly Item[] }[]
  /** One arrow of each thing that moves: enough to place all of it. */
  readonly within: ReadonlySet<string>
}

const none: ReadonlySet<string> = new Set()
const atRest: MovingScene = { moved: none, former: none, live: [], carried: [], after: undefined }

/** The moving part of the scene while a drag that began from `base` has a draft. */
export function useMovingScene(
  base: Scene | undefined,
  theme: Theme,
  view: ViewOptions,
): MovingScene {
  const draft = usePage((state) => state.draft)
  const sorted = useRef<Sorted>(undefined)
  useEffect(() => {
    if (!base) sorted.current = undefined
  }, [base])

  return useMemo(() => {
    if (!base || !draft) return atRest
    const answer = answerOf(draft.sheet)
    const { evaluation } = answer
    const options = { theme, labels: false, frozen: base, ...view }
    sorted.current ??= maybeSort(base, layout(draft.sheet, evaluation, { ...options, only: none }))
    if (!sorted.current) return atRest
    const { live, moved, groups, within } = sorted.current
    const after = layout(draft.sheet, evaluation, { ...options, only: live, within })
    const former = formerArrows(base.arrows, answer)
    const items = after.items.filter((item) => item.arrow !== undefined && live.has(item.arrow))
    return {
      moved,
      former,
      live: former.size === 0 ? items : greyedOf(items, former, theme),
      carried: groups.map(({ key, items }) => ({ key, items, by: carriedBy(base, after, key) })),
      after,
    }
  }, [base, draft, theme, view])
}

/** What moves is settled by the first frame in which anything does, and holds for the whole drag. */
function maybeSort(base: Scene, after: Scene): Sorted | undefined {
  const { live, carried } = displacementBetween(base, after)
  if (live.size === 0 && carried.length === 0) return undefined
  const groups = carried.map((keys) => ({
    key: [...keys][0] as string,
    items: base.items.filter((item) => item.arrow !== undefined && keys.has(item.arrow)),
  }))
  return {
    live,
    carried,
    groups,
    within: new Set([...live, ...groups.map(({ key }) => key)]),
    moved: new Set([...live, ...carried.flatMap((keys) => [...keys])]),
  }
}

function carriedBy(base: Scene, after: Scene, key: string): Place {
  const before = base.arrows.find((arrow) => arrow.key === key)
  const now = after.arrows.find((arrow) => arrow.key === key)
  if (!before || !now) return { x: 0, y: 0 }
  return { x: now.from.x - before.from.x, y: now.from.y - before.from.y }
}
