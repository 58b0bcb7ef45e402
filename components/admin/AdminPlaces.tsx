import { LinkButton } from '@/components/ui/LinkButton';

export function AdminPlaces() {
  return (
    <>
      <LinkButton href="/admin">Accounts</LinkButton>
      <LinkButton href="/admin/troubles">Letters and jobs</LinkButton>
      <LinkButton href="/admin/audit">Audit</LinkButton>
    </>
  );
}
