import { beforeAll, describe, expect, it, vi } from 'vitest';
import type { FromWorker, ToWorker } from '@/components/viewport/build.worker';
import { FAMILIES } from '@/generators/index';
import { meshFaults } from '@/lib/geometry/mesh-check';

const family = FAMILIES[0]!.about.id;
const answers: { message: FromWorker; transferred: readonly unknown[] }[] = [];
let say: (message: ToWorker) => void;

beforeAll(async () => {
  vi.stubGlobal('self', {
    addEventListener: (_type: string, listener: (event: { data: ToWorker }) => void) => {
      say = (data) => listener({ data });
    },
    postMessage: (message: FromWorker, { transfer }: { transfer: readonly unknown[] }) => {
      answers.push({ message, transferred: transfer });
    },
  });
  await import('@/components/viewport/build.worker');
});

async function ask(job: number, request: Partial<Extract<ToWorker, { kind: 'build' }>['request']>) {
  say({ kind: 'build', job, request: { family, parameters: {}, quality: 'preview', ...request } });
  return vi.waitUntil(() => answers.find((answer) => answer.message.job === job), 20_000);
}

const because = async (job: number, request: Parameters<typeof ask>[1]) => {
  const { message } = await ask(job, request);
  return message.kind === 'failed' ? message.because : message.kind;
};

describe('the build worker of the page', () => {
  it('answers a build with closed bodies and hands their memory over', async () => {
    const { message, transferred } = await ask(1, {});
    if (message.kind !== 'built') throw new Error(message.because);
    expect(message.bodies.length).toBeGreaterThan(0);
    expect(message.bodies.flatMap(({ mesh }) => meshFaults(mesh))).toEqual([]);
    expect(transferred).toEqual(
      message.bodies.flatMap(({ mesh }) => [mesh.positions.buffer, mesh.indices.buffer]),
    );
  });

  it('names what is wrong with the dimensions', async () => {
    expect(await because(2, { parameters: { nothingOfTheKind: 3 } })).toBe(
      'nothingOfTheKind is not a parameter of this family.',
    );
  });

  it('says that a family is not known', async () => {
    expect(await because(3, { family: 'trapdoor' })).toBe('family trapdoor was not found.');
  });

  it('builds after a warm-up, even of a family that is not known', async () => {
    say({ kind: 'warm-up', family });
    say({ kind: 'warm-up', family: 'trapdoor' });
    say({ kind: 'warm-up' });
    expect((await ask(4, {})).message.kind).toBe('built');
  });
});
