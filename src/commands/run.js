// Plain JavaScript without types, and with old syntax only: it must run on a Node that is too old for the
// rest, to say so.
const NAMES = [
  'build',
  'dev',
  'check',
  'compute',
  'new',
  'approve',
  'verify',
  'publish',
  'print',
  'titrate',
];
const NEEDED = [22, 18];

const found = process.versions.node.split('.').map(Number);
const name = process.argv[2];

if (found[0] < NEEDED[0] || (found[0] === NEEDED[0] && found[1] < NEEDED[1])) {
  refuse([
    `This is Node ${process.versions.node} on ${process.platform} ${process.arch}; Node ${NEEDED.join('.')} or newer is needed.`,
    'On Linux and macOS (x64 and arm64) and on Windows (x64) the project brings its own Node through npm:',
    'run "npm ci" without --omit=optional, then "npm run" and the name of the command.',
    'On any other machine install a newer Node from nodejs.org or your system, then run the command again.',
  ]);
} else if (!NAMES.includes(name)) {
  refuse([
    name ? `There is no command "${name}".` : 'Which command?',
    `The commands are ${NAMES.join(', ')}, as in: npm run check`,
  ]);
} else {
  import(`./${name}.ts`)
    .then((command) => command.main(process.argv.slice(3)))
    .then((status) => {
      if (typeof status === 'number') process.exitCode = status;
    })
    .catch((error) => {
      refuse([
        `The command ${name} stopped at a fault of its own, not of your files:`,
        error instanceof Error ? error.stack : String(error),
      ]);
    });
}

/** @param {string[]} lines */
function refuse(lines) {
  console.error(lines.join('\n'));
  process.exitCode = 1;
}
