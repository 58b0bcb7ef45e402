'use client';
import { AuthFrame } from '@/components/frame/AuthFrame';
import { Button } from '@/components/ui/Button';

export default function Failed({ reset }: { error: Error; reset: () => void }) {
  return (
    <AuthFrame>
      <h1 className="text-2xl">Something went wrong here</h1>
      <p>
        What was saved is safe. Photos, marks and findings of a round that were still on their way wait on
        this device.
      </p>
      <div>
        <Button look="chalk" onClick={reset}>
          Try again
        </Button>
      </div>
    </AuthFrame>
  );
}
