'use client'
/** Brings plants in from a file: choose or paste, look at what would come, then decide. Nothing is written before. */
import type { Route } from 'next'
import Link from 'next/link'
import { useRef, useState } from 'react'
import { Button, TextAreaField, TextField } from '@/components/ui'
import { askImport, askPreview, type ImportMode, type LineProblem, type Preview } from './import-calls'
import { doneSentence, GoodTable, plantCount, previewSentence, ProblemTable } from './import-preview'
import { CARD, HEADING } from './parts'
import { readCsvFile } from './read-csv-file'

interface State {
  text: string
  note: string
  busy: '' | 'check' | 'import'
  message: string
  preview: Preview | null
  /** What came of the last import. */
  done: { added: number; problems: LineProblem[] } | null
}

const EMPTY: State = { text: '', note: '', busy: '', message: '', preview: null, done: null }

function useImport() {
  const [state, setState] = useState(EMPTY)
  const running = useRef<AbortController | null>(null)
  const change = (part: Partial<State>) => setState((before) => ({ ...before, ...part }))
  const setText = (text: string, note = '') => {
    running.current?.abort()
    change({ text, note, message: '', preview: null, done: null, busy: '' })
  }
  const begin = (busy: State['busy']): AbortSignal => {
    running.current = new AbortController()
    change({ busy, message: '' })
    return running.current.signal
  }
  return {
    state,
    setText,
    stop: () => running.current?.abort(),
    takeFile: async (file: File | undefined) => {
      if (!file) return
      const read = await readCsvFile(file).catch(() => undefined)
      if (read) setText(read.text, [`Read from ${file.name}.`, read.note].filter(Boolean).join(' '))
      else change({ message: read === null ? 'The file is larger than 1 MB. Split it and bring in the parts.' : 'The file could not be read. Choose it again.', preview: null })
    },
    check: async () => {
      const signal = begin('check')
      const answer = await askPreview(state.text, signal)
      if (running.current?.signal === signal) change(answer.ok ? { busy: '', preview: answer.value } : { busy: '', message: answer.message, preview: null })
    },
    bring: async (mode: ImportMode) => {
      const answer = await askImport(state.text, mode, begin('import'))
      if (answer.ok) setState({ ...EMPTY, done: answer.value })
      else change({ busy: '', message: answer.message })
    },
  }
}

function Source({ work }: { work: ReturnType<typeof useImport> }) {
  const { state: { text, note, busy, message }, setText, takeFile, check, stop } = work
  return (
    <section className={CARD} aria-label="The file">
      <div className="grid grid-cols-1 gap-4">
        <TextField id="import-file" type="file" label="Choose a file" hint="CSV, up to 1 MB and 2,000 plants" accept=".csv,.txt,text/csv,text/plain" disabled={busy !== ''} onChange={(event) => { void takeFile(event.target.files?.[0]); event.target.value = '' }} />
        <TextAreaField id="import-text" label="Or paste it" hint={note || undefined} rows={8} spellCheck={false} wrap="off" value={text} readOnly={busy !== ''} onChange={(event) => setText(event.target.value)} />
      </div>
      <div className="mt-3 flex flex-wrap items-center gap-3">
        <Button disabled={busy !== '' || text.trim() === ''} onClick={() => void check()}>{busy === 'check' ? 'Looking it over…' : 'Look it over'}</Button>
        {busy === 'check' && <Button onClick={stop}>Stop</Button>}
        <a href="/api/plants/import/template" download className="inline-flex min-h-11 items-center px-2 underline underline-offset-4">Template with an example</a>
      </div>
      <p role="alert" className="mt-2 text-conflict">{message}</p>
    </section>
  )
}

function Decision({ preview, busy, bring }: { preview: Preview; busy: boolean; bring: (mode: ImportMode) => void }) {
  const [mode, setMode] = useState<ImportMode>('good-rows')
  const { good, problems } = preview
  const refuses = problems.length > 0 && mode === 'all-or-none'
  const choices = [['good-rows', `Keep the good lines: ${plantCount(good.length)}`], ['all-or-none', 'Refuse all until every line is good']] as const
  return (
    <section className={CARD} aria-label="Decide">
      {problems.length > 0 && (
        <fieldset className="mb-3">
          <legend className={HEADING}>What about the lines with problems?</legend>
          {choices.map(([value, words]) => (
            <label key={value} className="flex min-h-11 items-center gap-2">
              <input type="radio" name="mode" value={value} checked={mode === value} onChange={() => setMode(value)} className="size-5 accent-leaf" />
              {words}
            </label>
          ))}
        </fieldset>
      )}
      {refuses
        ? <p>Nothing will be brought in. Mend the lines above in the file, then look it over again.</p>
        : <Button variant="primary" disabled={busy || good.length === 0} onClick={() => bring(mode)}>{busy ? 'Bringing in…' : `Bring in ${plantCount(good.length)}`}</Button>}
    </section>
  )
}

export function PlantImport() {
  const work = useImport()
  const { state: { preview, busy, done }, bring } = work
  return (
    <div className="grid grid-cols-1 gap-4">
      <Source work={work} />
      <div role="status" className="font-bold">
        {done && <p>{doneSentence(done)} <Link href={'/plants?owner=own' as Route} className="inline-flex min-h-11 items-center underline underline-offset-4">See your own plants</Link></p>}
        {preview && previewSentence(preview)}
      </div>
      {done && done.problems.length > 0 && <ProblemTable title="Lines left out" problems={done.problems} />}
      {preview && preview.problems.length > 0 && <ProblemTable problems={preview.problems} />}
      {preview?.isReadable && preview.good.length > 0 && <GoodTable good={preview.good} notes={preview.notes} />}
      {preview?.isReadable && preview.good.length > 0 && <Decision preview={preview} busy={busy === 'import'} bring={(mode) => void bring(mode)} />}
    </div>
  )
}
