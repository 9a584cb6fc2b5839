'use strict';
// Reads the words behind `npm start --` and `npm run dev --`.

const usage = `Usage: npm start -- [--reset] [--port N] [--no-seed]
  --reset     makes the demo anew; what was entered is lost
  --port N    serves on this port (or set SEAMWRIGHT_PORT; 4300 when neither is given)
  --no-seed   starts with an empty house instead of the demo`;

/**
 * @param {string[]} words
 * @param {Record<string, string | undefined>} env
 * @returns {{reset: boolean, seed: boolean, help: boolean, port: number}}
 * @throws {Error} with the usage, when a word is not understood
 */
function readStartOptions(words, env) {
  const options = {
    reset: false,
    seed: true,
    help: false,
    port: readPort(env.SEAMWRIGHT_PORT || '4300', 'SEAMWRIGHT_PORT'),
  };
  for (let i = 0; i < words.length; i++) {
    const [word, joined] = words[i].split('=', 2);
    if (words[i] === '--reset') options.reset = true;
    else if (words[i] === '--no-seed') options.seed = false;
    else if (words[i] === '--help') options.help = true;
    else if (word === '--port') options.port = readPort(joined ?? words[++i], '--port');
    else throw new Error(`"${words[i]}" is not understood.\n${usage}`);
  }
  return options;
}

function readPort(text, from) {
  const port = /^\d{1,5}$/.test(text ?? '') ? Number(text) : NaN;
  if (!(port >= 1 && port <= 65535))
    throw new Error(`${from} must be a port from 1 to 65535, not "${text ?? ''}".\n${usage}`);
  return port;
}

module.exports = { readStartOptions, usage };
