import { useRef, useState } from 'react';
import { Notice } from '../../../components/feedback/notice';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Progress } from '../../../components/feedback/progress';
import { Button } from '../../../components/ui/button';
import { fileSize } from '../../../lib/file-size';
import { useUploadAttachment } from '../api/upload-attachment';
import type { AttachmentSubject } from '../api/upload-attachment';
import { TAKEN_TYPES, whyNot } from '../model/acceptable';

interface AttachButtonProps {
  number: string;
  subject?: AttachmentSubject;
  label?: string;
}

/** Attaches a file: chosen, sent with its progress, or refused with the reason. */
export function AttachButton({ number, subject = {}, label = 'Attach a file' }: AttachButtonProps) {
  const input = useRef<HTMLInputElement>(null);
  const [file, setFile] = useState<File | null>(null);
  const [refusal, setRefusal] = useState<string | null>(null);
  const [share, setShare] = useState(0);
  const send = useUploadAttachment(number, subject, setShare);

  const choose = (chosen: File | undefined) => {
    if (!chosen) return;
    const reason = whyNot(chosen);
    setRefusal(reason);
    setFile(chosen);
    // what was said of the file before says nothing of this one
    send.reset();
    if (reason) return;
    setShare(0);
    send.mutate(chosen);
  };
  return (
    <div className="grid min-w-0 gap-2">
      <div>
        <input
          ref={input}
          type="file"
          className="sr-only"
          tabIndex={-1}
          aria-label={label}
          accept={TAKEN_TYPES.join(',')}
          onChange={(event) => {
            choose(event.target.files?.[0]);
            // The same file may be chosen again after a refusal.
            event.target.value = '';
          }}
        />
        <Button small busy={send.isPending} onClick={() => input.current?.click()}>
          {label}
        </Button>
      </div>
      {send.isPending && file && (
        <div className="w-64 max-w-full">
          <Progress
            label={`Sending ${file.name}`}
            done={Math.round(share * file.size)}
            total={file.size}
            format={fileSize}
          />
        </div>
      )}
      {refusal && (
        <Notice grade="must-answer" announce>
          {refusal}
        </Notice>
      )}
      <ProblemNotice error={send.error} />
      {send.isSuccess && !refusal && (
        <p className="text-table text-ink-soft" role="status">{`${file?.name ?? 'The file'} is kept.`}</p>
      )}
    </div>
  );
}
