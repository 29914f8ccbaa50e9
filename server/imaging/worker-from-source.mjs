// Lets a worker thread run a source file as it stands, where the server is not bundled.
import { workerData } from 'piscina';
import { register } from 'tsx/esm/api';

register();
const { file } = workerData;
const { default: work } = await import(file);
export default work;
