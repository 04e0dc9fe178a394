import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { ReceivedMail } from '#shared/contracts/api.generated';
import { formatInstant } from '#shared/format/dates';
import { EmptyState } from '../../../components/feedback/empty-state';
import { PageHead } from '../../../components/ui/page-head';
import { Sheet } from '../../../components/ui/sheet';
import { fileSize } from '../../../lib/file-size';
import { useMailRoom } from '../api/get-mail-room';

interface MailListProps {
  mails: readonly ReceivedMail[];
  shown: string;
  onShow: (id: string) => void;
}

function MailList({ mails, shown, onShow }: MailListProps) {
  return (
    <ul>
      {mails.map((mail) => (
        <li key={mail.id} className="border-t border-rule first:border-t-0">
          <button
            type="button"
            aria-current={mail.id === shown ? 'true' : undefined}
            onClick={() => onShow(mail.id)}
            className="block w-full border-l-[3px] border-transparent px-4 py-2.5 text-left text-table hover:bg-copper-wash aria-[current]:border-copper aria-[current]:bg-copper-wash"
          >
            <span className="block font-semibold">{mail.subject || 'no subject'}</span>
            <span className="block [overflow-wrap:anywhere]">{`to ${mail.to}`}</span>
            <span className="block text-label text-ink-soft">{formatInstant(mail.receivedAt)}</span>
          </button>
        </li>
      ))}
    </ul>
  );
}

/** The words of a mail; addresses of this product become links. */
function MailBody({ text }: { text: string }) {
  return text.split(/(https?:\/\/\S+)/).map((part, i) => {
    const ours = part.startsWith(`${window.location.origin}/`);
    if (!ours) return part;
    return (
      <Link key={i} className="link" to={part.slice(window.location.origin.length)}>
        {part}
      </Link>
    );
  });
}

function MailSheet({ mail }: { mail: ReceivedMail }) {
  return (
    <Sheet main title={mail.subject || 'no subject'} aside={formatInstant(mail.receivedAt)}>
      <div className="sheet-body">
        <dl className="mb-4 grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 border-b border-rule pb-3 text-table">
          <dt className="text-ink-soft">From</dt>
          <dd>{mail.from}</dd>
          <dt className="text-ink-soft">To</dt>
          <dd className="[overflow-wrap:anywhere]">{mail.to}</dd>
        </dl>
        <p className="max-w-prose whitespace-pre-wrap [overflow-wrap:anywhere]">
          <MailBody text={mail.body} />
        </p>
        {mail.attachments.length > 0 && (
          <ul className="mt-4 border-t border-rule pt-3 text-table">
            {mail.attachments.map((file) => (
              <li key={file.name}>{`${file.name}, ${fileSize(file.byteLength)}`}</li>
            ))}
          </ul>
        )}
      </div>
    </Sheet>
  );
}

/** Every mail of the demo: nothing leaves this computer. */
export function MailRoomPage() {
  const mails = useMailRoom();
  const [chosen, setChosen] = useState<string | null>(null);
  const shown = mails.find((m) => m.id === chosen) ?? mails[0];
  return (
    <>
      <PageHead
        title="Mail room"
        lead="What the demo would have sent by mail. Nothing leaves this computer; new mail shows by itself."
      />
      {shown ? (
        <div className="two-columns">
          <Sheet side title="Mails" aside={String(mails.length)} className="max-h-[80vh] overflow-y-auto">
            <MailList mails={mails} shown={shown.id} onShow={setChosen} />
          </Sheet>
          <div className="min-w-0">
            <MailSheet mail={shown} />
          </div>
        </div>
      ) : (
        <Sheet main label="Mails">
          <EmptyState title="No mail yet">Filing, returning and deciding each send one.</EmptyState>
        </Sheet>
      )}
    </>
  );
}
