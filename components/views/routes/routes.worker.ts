/** The engine in a thread of its own: the page stays alive while a side's routes are computed. */
import { answerAsks } from '@/components/ui/worker-door';
import { answerRoutes } from './answer';

answerAsks(answerRoutes);
