import type { Locate } from '../../protocol/toWorker';
import type { Sitting } from '../desk';
import { scoutFiles } from '../filesAtHand';
import type { Reply } from '../reply';
