import { createRoot } from 'react-dom/client'
import { Arrow, Layer, Stage } from 'react-konva/lib/ReactKonvaCore'
import 'konva/lib/shapes/Arrow'

// The least that a page with React and Konva can be: one arrow. The benchmark holds ours against it.
const name = 'first-shafts'

function markOnce(): void {
  if (performance.getEntriesByName(name).length === 0) performance.mark(name)
}

const root = document.getElementById('root')
if (root !== null) {
  createRoot(root).render(
    <Stage width={900} height={640}>
      <Layer onDraw={markOnce}>
        <Arrow points={[100, 500, 400, 200]} stroke="black" fill="black" />
      </Layer>
    </Stage>,
  )
}
