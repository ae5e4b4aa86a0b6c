'use client'

import { useRouter } from 'next/navigation'
import { useEffect, useRef, useState } from 'react'

import { sendFile } from './send-file'
import { isUnderWay, type Upload, type UploadState } from './upload-state'

/** Sends files one after another and keeps what became of each, so that a refused one can be tried again. */
export function useUploads(engagementId: string) {
  const router = useRouter()
  const [uploads, setUploads] = useState<readonly Upload[]>([])
  const nextKey = useRef(0)
  const line = useRef<Promise<void>>(Promise.resolve())

  const report = (key: number, state: UploadState) =>
    setUploads((known) => known.map((upload) => (upload.key === key ? { ...upload, state } : upload)))

  const queue = (key: number, file: File) => {
    line.current = line.current.then(async () => {
      await sendFile(engagementId, file, (state) => report(key, state))
      router.refresh()
    })
  }

  const add = (files: readonly File[]) => {
    const added = files.map((file) => ({
      key: nextKey.current++,
      file,
      state: { phase: 'waiting' } as const,
    }))
    setUploads((known) => [...known, ...added])
    for (const { key, file } of added) queue(key, file)
  }

  const retry = ({ key, file }: Upload) => {
    report(key, { phase: 'waiting' })
    queue(key, file)
  }

  const dismiss = ({ key }: Upload) => setUploads((known) => known.filter((upload) => upload.key !== key))

  useWarningBeforeLeaving(uploads.some(isUnderWay))
  return { uploads, add, retry, dismiss }
}

function useWarningBeforeLeaving(isBusy: boolean): void {
  useEffect(() => {
    if (!isBusy) return
    const warn = (event: BeforeUnloadEvent) => event.preventDefault()
    window.addEventListener('beforeunload', warn)
    return () => window.removeEventListener('beforeunload', warn)
  }, [isBusy])
}
