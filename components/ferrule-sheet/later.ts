/** Parts that no first result needs: they are fetched once the options stand on the screen. */
import '../build-part/build-part.ts';
import '../evidence-part/evidence-part.ts';
import '../network-part/network-part.ts';
import '../record-part/record-part.ts';
import '../response-part/response-part.ts';
