import { AuthFrame } from '@/components/frame/AuthFrame';
import { LinkButton } from '@/components/ui/LinkButton';

export default function NotFound() {
  return (
    <AuthFrame>
      <h1 className="text-2xl">There is nothing at this address</h1>
      <p>Perhaps it was removed, or it was never yours to see.</p>
      <div>
        <LinkButton href="/journals">To the rail</LinkButton>
      </div>
    </AuthFrame>
  );
}
