import { useState } from 'react';
import { uploadFile } from '@/shared/contracts/files';
import { callApi } from '../data/call-api';
import { newId } from '../data/new-id';
import { problemMessage } from '../data/problem-message';

/** A file that is with the server: what a form keeps of it. */
export type SentFile = { id: string; name: string; mediaType: string };
type Going = { file: File; key: string; state: 'going' | 'failed'; problem?: string };

/** Sends each file as it is picked; what did not arrive stays, to be tried again under the same key or taken off. */
export function useSentFiles(onSent: (file: SentFile) => void) {
  const [going, setGoing] = useState<Going[]>([]);
  const change = (key: string, to: Partial<Going>) =>
    setGoing((all) => all.map((each) => (each.key === key ? { ...each, ...to } : each)));

  const send = async ({ file, key }: Pick<Going, 'file' | 'key'>): Promise<void> => {
    change(key, { state: 'going' });
    try {
      const { id, name, mediaType } = await callApi(uploadFile, { files: { file: [file] }, key });
      setGoing((all) => all.filter((each) => each.key !== key));
      onSent({ id, name, mediaType });
    } catch (error) {
      change(key, { state: 'failed', problem: problemMessage(error).sentence });
    }
  };

  return {
    files: going.map((each) => each.file),
    isGoing: going.some((each) => each.state === 'going'),
    failed: going.filter((each) => each.state === 'failed'),
    /** What the picker now holds: new ones are sent, those missing are taken off. */
    pick: (files: readonly File[]) => {
      const kept = going.filter((each) => files.includes(each.file));
      const added = files
        .filter((file) => !going.some((each) => each.file === file))
        .map((file) => ({ file, key: newId(), state: 'going' as const }));
      setGoing([...kept, ...added]);
      added.forEach((each) => void send(each));
    },
    sendAgain: () => going.filter((each) => each.state === 'failed').forEach((each) => void send(each)),
  };
}
