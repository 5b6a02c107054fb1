import * as z from 'zod';
import { contract } from './contract';

export const getHealth = contract({
  method: 'GET',
  path: '/api/health',
  access: 'public',
  summary: 'Whether the server is ready',
  reply: z.object({ status: z.literal('ready') }),
});
