'use client';
import { AuthFrame } from '@/components/frame/AuthFrame';
import { Button } from '@/components/ui/Button';

export default function Failed({ reset }: { error: Error; reset: () => void }) {
  return (
    <AuthFrame>
      <h1 className="text-2xl">Something went wrong here</h1>
      <p>Nothing of yours was lost. What you had not saved is still on this device.</p>
      <div>
        <Button look="chalk" onClick={reset}>
          Try again
        </Button>
      </div>
    </AuthFrame>
  );
}
