import 'server-only';
import { headers } from 'next/headers';
import { deviceLabel } from '@/lib/domain/account/device-label';

/** Browser and system of the request at hand, in words. */
export const requestDevice = async (): Promise<string> => deviceLabel((await headers()).get('user-agent'));
