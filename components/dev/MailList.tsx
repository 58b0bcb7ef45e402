import type { CaughtMail } from '@/lib/mail/caught';

const LINK = /(https?:\/\/\S+)/;

export function MailList({ mails }: { mails: CaughtMail[] }) {
  if (mails.length === 0) return <p>Nothing yet.</p>;
  return (
    <ul className="grid gap-6">
      {mails.map((mail) => (
        <li key={mail.id} className="border-l-4 border-seam bg-paper px-4 py-3">
          <h2 className="font-bold">{mail.subject}</h2>
          <p className="text-sm text-graphite">
            to {mail.to.join(', ')}, {mail.receivedAt}
          </p>
          <p className="mt-2 [overflow-wrap:anywhere] whitespace-pre-wrap">
            {mail.text.split(LINK).map((part, i) =>
              LINK.test(part) ? (
                <a key={i} href={part} className="text-chalk underline">
                  {part}
                </a>
              ) : (
                part
              ),
            )}
          </p>
        </li>
      ))}
    </ul>
  );
}
