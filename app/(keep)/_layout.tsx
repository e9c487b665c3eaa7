import { Slot } from 'expo-router';
import { KeepGate } from '@/components/session/KeepGate';

export default function KeepLayout() {
  return (
    <KeepGate>
      <Slot />
    </KeepGate>
  );
}
