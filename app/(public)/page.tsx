import { JobSteps } from '@/components/landing/JobSteps';
import { Opening } from '@/components/landing/Opening';
import { Promises } from '@/components/landing/Promises';

export default function LandingPage() {
  return (
    <div className="grid gap-14">
      <Opening />
      <JobSteps />
      <Promises />
    </div>
  );
}
