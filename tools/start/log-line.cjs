'use strict';
// Reads one line of a child's output: pino writes JSON, everything else writes what it likes.

const words = { 40: 'warning', 50: 'error', 60: 'fatal' };

/**
 * What the terminal shows of a line; undefined for what belongs in the log file alone.
 * @param {string} line
 * @param {'out' | 'err'} stream
 * @returns {string | undefined}
 */
function forTerminal(line, stream) {
  if (line.trim() === '') return undefined;
  const entry = readEntry(line);
  if (!entry) return stream === 'err' ? line : undefined;
  const level = Math.floor(entry.level / 10) * 10;
  if (!(level >= 40)) return undefined;
  const cause = entry.err?.message && entry.err.message !== entry.msg ? `: ${entry.err.message}` : '';
  return `${words[level] ?? 'error'}: ${entry.msg ?? ''}${cause}`;
}

function readEntry(line) {
  if (!line.startsWith('{')) return undefined;
  try {
    const entry = JSON.parse(line);
    return typeof entry.level === 'number' ? entry : undefined;
  } catch {
    return undefined;
  }
}

module.exports = { forTerminal };
