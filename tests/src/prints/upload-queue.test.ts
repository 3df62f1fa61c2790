import { describe, expect, it } from 'vitest';
import { MAX_UPLOAD_BYTES, printSchema, type UploadedPrint } from '#shared/contracts/prints';
import { createUploadQueue, refusalBeforeSending, shownName } from '@/features/prints/model/upload-queue';
import { buildPrint } from '../../support/builders';

interface Sent {
  readonly file: File;
  readonly pileId: string | null;
  readonly progress: (share: number) => void;
  readonly succeed: (known?: boolean) => void;
  readonly fail: (reason: string) => void;
}

function setUp(mayRetry = false) {
  const sent: Sent[] = [];
  let serial = 0;
  let arrivals = 0;
  const queue = createUploadQueue({
    makeId: () => `id-${(serial += 1)}`,
    onArrived: () => (arrivals += 1),
    explain: (error) => ({ reason: (error as Error).message, mayRetry }),
    send: (file, _id, pileId, progress) =>
      new Promise<UploadedPrint>((resolve, reject) => {
        sent.push({
          file,
          pileId,
          progress,
          succeed: (known = false) => resolve({ print: printSchema.parse(buildPrint()), known }),
          fail: (reason) => reject(new Error(reason)),
        });
      }),
  });
  const states = () => queue.getState().arrivals.map(({ state }) => state);
  return { queue, sent, states, arrivals: () => arrivals };
}

const photo = (name: string): File => new File(['x'], name);
const photos = (count: number): File[] => Array.from({ length: count }, (_, i) => photo(`${i}.jpg`));
const settle = (): Promise<void> => new Promise((resolve) => setTimeout(resolve));

describe('the upload queue', () => {
  it('sends three at a time and takes the next as soon as one is through', async () => {
    const { queue, sent, states } = setUp();
    queue.getState().add(photos(5), null);
    expect(sent.map(({ file }) => file.name)).toEqual(['0.jpg', '1.jpg', '2.jpg']);
    sent[1]!.succeed();
    await settle();
    expect(sent).toHaveLength(4);
    expect(states()).toEqual(['sending', 'arrived', 'sending', 'sending', 'waiting']);
  });

  it('lets one refusal stand beside the others’ success', async () => {
    const { queue, sent, states, arrivals } = setUp();
    queue.getState().add(photos(3), 'pile');
    sent[0]!.fail('This is a text file: choose the photograph itself.');
    sent[1]!.succeed();
    sent[2]!.succeed(true);
    await settle();
    expect(states()).toEqual(['refused', 'arrived', 'known']);
    expect(queue.getState().arrivals[0]!.reason).toBe('This is a text file: choose the photograph itself.');
    expect(arrivals()).toBe(2);
    expect(sent[0]!.pileId).toBe('pile');
  });

  it('tells how much was sent, and then that the server looks at it', () => {
    const { queue, sent } = setUp();
    queue.getState().add(photos(1), null);
    sent[0]!.progress(0.62);
    expect(queue.getState().arrivals[0]).toMatchObject({ state: 'sending', share: 0.62 });
    sent[0]!.progress(1);
    expect(queue.getState().arrivals[0]!.state).toBe('reading');
  });

  it('keeps a file that could not be sent, and sends it again when asked', async () => {
    const { queue, sent, states } = setUp(true);
    queue.getState().add(photos(1), null);
    sent[0]!.fail('No connection.');
    await settle();
    expect(states()).toEqual(['unsent']);
    queue.getState().retry('id-1');
    expect(sent[1]!.file.name).toBe('0.jpg');
    sent[1]!.succeed();
    await settle();
    expect(states()).toEqual(['arrived']);
  });

  it('takes 200 files at once and refuses the rest with a reason', () => {
    const { queue, states } = setUp();
    queue.getState().add(photos(203), null);
    expect(states().filter((state) => state === 'refused')).toHaveLength(3);
    expect(queue.getState().arrivals[200]!.reason).toContain('200 files');
  });

  it('clears what is settled and leaves what is under way', async () => {
    const { queue, sent, states } = setUp();
    queue.getState().add(photos(2), null);
    sent[0]!.succeed();
    await settle();
    queue.getState().clear();
    expect(states()).toEqual(['sending']);
  });
});

describe('a file looked at before it is sent', () => {
  it.each([
    [0, 'The file is empty'],
    [MAX_UPLOAD_BYTES + 1, 'The file has 51 MB and the limit is 50 MB'],
  ])('is refused at %d bytes', (size, words) => {
    expect(refusalBeforeSending({ size }, 0)).toContain(words);
  });

  it('passes at exactly the limit', () => {
    expect(refusalBeforeSending({ size: MAX_UPLOAD_BYTES }, 199)).toBeNull();
  });

  it('is shown without marks that turn the reading direction', () => {
    expect(shownName('gran\u202egpj.exe')).toBe('grangpj.exe');
    expect(shownName('\u200f')).toBe('A file without a name');
  });
});
