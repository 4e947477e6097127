import { Suspense } from 'react'
import { AnswerPanel } from '../answer'
import { Board } from '../board'
import { CheckLine } from '../check'
import { Circuit } from '../circuit'
import { DrawingSettings, TitleBlock } from '../details'
import { HandPanel } from '../hand'
import { CopyBanner, KeepNotes } from '../keep'
import { VersionNote } from '../offline'
import { Readings } from '../readings'
import { BeforeMeasuring, Findings } from '../report'
import { Schedule } from '../schedule'
import { Sums } from '../sums'
import { Announcer } from './Announcer'
import { FirstVisit } from './FirstVisit'
import { Header } from './Header'
import { Notice } from './Notice'
import { useShortcuts } from './useShortcuts'

/** The page: the sheet on its desk, its schedule beside it, the check line under both. */
export function App() {
  useShortcuts()
  return (
    <main className="page">
      <Header />
      <Board />
      <div className="side">
        <KeepNotes />
        <VersionNote />
        <Notice />
        <CopyBanner />
        <FirstVisit />
        <Schedule />
        <Sums />
        <HandPanel />
        <Suspense>
          <Readings />
          <Circuit />
        </Suspense>
        <AnswerPanel />
        <section aria-label="Sheet">
          <TitleBlock />
          <BeforeMeasuring />
          <Findings />
          <DrawingSettings />
        </section>
        <Safety />
      </div>
      <CheckLine />
      <Announcer />
    </main>
  )
}

/** The caution that every sheet carries. */
function Safety() {
  return (
    <p className="safety">
      Readings are taken on live circuits. Local rules and licensed practice have the last word, and
      nothing on this page replaces them.
    </p>
  )
}
