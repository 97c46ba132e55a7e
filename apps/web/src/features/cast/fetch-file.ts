import { toast } from 'sonner';
import { download } from '@/lib/download.ts';
import { sayProblem } from '@/lib/problem.ts';

/** Downloads a file, or says why it cannot be had. */
export const fetchFile = (path: string, query?: Record<string, string>) => {
  download(path, query).catch((error: unknown) => toast(sayProblem(error)));
};
