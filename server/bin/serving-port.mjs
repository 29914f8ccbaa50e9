import { Failure } from './failure.mjs';
import { freePortFrom } from './ports.mjs';

const USUAL_PORT = 3000;

/** The port to serve on: PORT or 3000, or the next free one when that is taken. */
export async function choosePort(host, say) {
  const wanted = process.env.PORT ? Number(process.env.PORT) : USUAL_PORT;
  if (!Number.isInteger(wanted) || wanted < 1 || wanted > 65_535) {
    throw new Failure(`PORT is "${process.env.PORT}", which is not a port.`, 'Give a number from 1 to 65535.');
  }
  const port = await freePortFrom(wanted, host);
  if (port === undefined) {
    throw new Failure(`Port ${wanted} and the hundred after it are taken.`, 'Give another with PORT=…');
  }
  if (port !== wanted) say(`Port ${wanted} is taken; taking ${port} instead.`);
  return port;
}
