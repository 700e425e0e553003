/** What no first result needs: it is fetched once the options stand on the screen. */
import '../build-part/build-part.ts';
import '../contents-rule/contents-rule.ts';
import '../evidence-part/evidence-part.ts';
import '../finished-board/finished-board.ts';
import '../kept-line/kept-line.ts';
import '../measured-data/measured-data.ts';
import '../network-part/network-part.ts';
import '../record-part/record-part.ts';
import '../response-part/response-part.ts';
import '../start-revision/start-revision.ts';

export { groundsOf } from '../../src/design/grounds.ts';
export { DraftKeeper } from '../record-store/draft-keeper.ts';
export { keptIdIn } from '../record-store/kept-address.ts';
