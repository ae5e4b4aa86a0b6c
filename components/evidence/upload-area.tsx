'use client'

import type { ReactNode } from 'react'
import { useDropzone } from 'react-dropzone'

import { Button } from '../ui/button'
import { classNames } from '../ui/class-names'
import { Sheet } from '../ui/sheet'
import { UploadRow } from './upload-row'
import { isUnderWay } from './upload-state'
import { useDropBeside } from './use-drop-beside'
import { useUploads } from './use-uploads'

type UploadAreaProps = {
  readonly engagementId: string
  readonly limitInWords: string
  /** The rest of the page: files may be dropped anywhere on it. */
  readonly children: ReactNode
}

export const UploadArea = ({ engagementId, limitInWords, children }: UploadAreaProps) => {
  const { uploads, add, retry, dismiss } = useUploads(engagementId)
  const { getRootProps, getInputProps, isDragActive, isDragGlobal, open, rootRef } = useDropzone({
    onDrop: (files) => add(files),
    noClick: true,
    noKeyboard: true,
  })
  useDropBeside(rootRef, add)
  const left = uploads.filter(isUnderWay).length
  return (
    <div {...getRootProps({ role: undefined, tabIndex: undefined })} className="flex flex-col gap-6">
      <div
        className={classNames(
          'rounded border-2 border-dashed bg-sheet px-4 py-5 sm:px-6',
          isDragActive || isDragGlobal ? 'border-copper bg-copper-wash' : 'border-rule-strong',
        )}
      >
        <input {...getInputProps({ style: undefined, className: 'sr-only', 'aria-label': 'Files to add' })} />
        <div className="flex flex-wrap items-center justify-between gap-x-8 gap-y-3">
          <div className="min-w-0 max-w-measure">
            <p className="font-serif text-lg font-semibold">
              {isDragActive || isDragGlobal
                ? 'Let go to add the files'
                : 'Drag files anywhere onto this page'}
            </p>
            <p className="text-sm text-ink-soft">
              Captures as delimited text (.csv .tsv .txt .dat), .pdf, .svg, pictures, Touchstone, .zip; up to{' '}
              {limitInWords} a file.
            </p>
          </div>
          <Button tone="primary" onClick={open}>
            Choose files
          </Button>
        </div>
      </div>
      {uploads.length > 0 ? (
        <Sheet title="On their way">
          <p role="status" className="sr-only">
            {left > 0 ? `${left} files on their way` : 'Every file has arrived or was refused'}
          </p>
          <ul className="-my-3">
            {uploads.map((upload) => (
              <UploadRow
                key={upload.key}
                upload={upload}
                engagementId={engagementId}
                onRetry={() => retry(upload)}
                onDismiss={() => dismiss(upload)}
              />
            ))}
          </ul>
        </Sheet>
      ) : null}
      {children}
    </div>
  )
}
