'use client';
import { useEffect, useState } from 'react';

/** How far the phone is rolled from upright, in degrees clockwise; null where it does not say. */
export function useLevel(): number | null {
  const [rollDeg, setRollDeg] = useState<number | null>(null);
  useEffect(() => {
    const turned = ({ beta, gamma }: DeviceOrientationEvent) => {
      // Lying flat there is no upright to be rolled from.
      if (beta === null || gamma === null || Math.abs(beta) < 30) return setRollDeg(null);
      setRollDeg(Math.round(gamma));
    };
    window.addEventListener('deviceorientation', turned);
    return () => window.removeEventListener('deviceorientation', turned);
  }, []);
  return rollDeg;
}
