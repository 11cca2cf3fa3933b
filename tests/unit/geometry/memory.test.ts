import { beforeAll, describe, expect, it, vi } from 'vitest';
import { createKernelHost, type KernelHost } from '@/lib/geometry/host';
import { type Kernel, KernelError, QUALITY, type Vec2 } from '@/lib/geometry/kernel';
import { translation } from '@/lib/geometry/placement';

let host: KernelHost;
let heap: WebAssembly.Memory;
beforeAll(async () => {
  const instantiate = vi.spyOn(WebAssembly, 'instantiate');
  host = await createKernelHost();
  const { instance } = await (instantiate.mock.results[0]!
    .value as Promise<WebAssembly.WebAssemblyInstantiatedSource>);
  heap = Object.values(instance.exports).find(
    (one) => one instanceof WebAssembly.Memory,
  ) as WebAssembly.Memory;
  instantiate.mockRestore();
});

function wave(points: number): Vec2[] {
  return Array.from({ length: points }, (_, at) => {
    const angle = (2 * Math.PI * at) / points;
    const radius = 20 + Math.cos(angle * 40);
    return [radius * Math.cos(angle), radius * Math.sin(angle)];
  });
}
const wavy = wave(160);
/** Left behind, its points would cost 96 KB each time. */
const fine = wave(6000);

function make(kernel: Kernel) {
  const { outlines } = kernel;
  const ring = outlines.subtract({ loops: [wavy] }, [outlines.circle(12)]);
  const plate = kernel.extrude(ring, 3);
  const tube = kernel.revolve(outlines.rectangle(2, 2, { center: [30, 1] }), 16);
  const cut = kernel.place(kernel.box([50, 2, 1]), translation([0, 0, 3]));
  return [
    { name: 'wheel', solid: kernel.subtract(plate, [cut]) },
    { name: 'tube', solid: tube },
  ];
}

const fail = (kernel: Kernel) => {
  make(kernel);
  return [{ name: 'nothing', solid: kernel.extrude({ loops: [wavy] }, 0) }];
};

function times(count: number, run: () => void): number {
  for (let at = 0; at < count; at += 1) run();
  return heap.buffer.byteLength;
}

describe('the memory of the kernel', () => {
  it('stays as it is over 500 builds', () => {
    const settled = times(20, () => host.build(make, QUALITY.preview));
    expect(times(500, () => host.build(make, QUALITY.preview))).toBe(settled);
  }, 120_000);

  it('stays as it is over 200 outlines handed to the kernel and taken back', () => {
    const planeWork = () =>
      host.build((kernel) => {
        kernel.outlines.union([{ loops: [fine] }]);
        return [{ name: 'box', solid: kernel.box([1, 1, 1]) }];
      }, QUALITY.preview);
    const settled = times(20, planeWork);
    expect(times(200, planeWork)).toBe(settled);
  }, 120_000);

  it('stays as it is over 300 builds that fail half way', () => {
    const failing = () => expect(() => host.build(fail, QUALITY.preview)).toThrow(KernelError);
    const settled = times(20, failing);
    expect(times(300, failing)).toBe(settled);
  }, 120_000);
});
