import { openPieces, roomForPack } from './index';

const line = { position: 2, pieces: 24, packedPieces: 14, shortPieces: 1 };

describe('packing a line', () => {
  it('waits for what is neither packed nor short', () => {
    expect(openPieces(line)).toBe(9);
  });

  it('takes no more pieces than it still waits for', () => {
    expect(roomForPack(line, 9).ok).toBe(true);
    expect(roomForPack(line, 10)).toMatchObject({
      refusal: { code: 'pack-over-line', params: { line: 2, open: 9, pieces: 10 }, pointer: '/pieces' },
    });
  });
});
