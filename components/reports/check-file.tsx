'use client'

import { useMutation } from '@tanstack/react-query'
import { useDropzone } from 'react-dropzone'

import { DataProvider } from '../shell/data-provider'
import { Notice } from '../ui/notice'
import { CheckVerdict } from './check-verdict'
import { requestCheck } from './request-check'

/** Drop a report, or choose one: the answer appears below. */
export const CheckFile = () => (
  <DataProvider>
    <CheckArea />
  </DataProvider>
)

const CheckArea = () => {
  const check = useMutation({ mutationFn: requestCheck })
  const { getRootProps, getInputProps, isDragActive, open } = useDropzone({
    accept: { 'application/pdf': ['.pdf'] },
    multiple: false,
    noClick: true,
    noKeyboard: true,
    onDropAccepted: ([file]) => {
      if (file) check.mutate(file)
    },
  })
  return (
    <div className="flex flex-col gap-5">
      <div
        {...getRootProps()}
        className={`rounded border-2 border-dashed px-5 py-8 text-center ${
          isDragActive ? 'border-copper bg-copper-wash' : 'border-rule-strong bg-ground'
        }`}
      >
        <input
          {...getInputProps({
            style: undefined,
            className: 'sr-only',
            'aria-label': 'Report to check (PDF)',
          })}
        />
        <p className="mb-3">Drop the PDF here, or</p>
        <button type="button" onClick={open} className="text-link min-h-6 font-semibold">
          choose the file
        </button>
      </div>
      <div aria-live="polite">
        {check.isPending ? <p role="status">Checking the signatures…</p> : null}
        {check.error ? <Notice tone="error">{check.error.message}</Notice> : null}
        {check.data && !check.isPending ? <CheckVerdict checked={check.data} /> : null}
      </div>
    </div>
  )
}
