import { useQuery } from '@tanstack/react-query';
import { useScheme } from '../../schemes/scheme-context.ts';
import { ownQuery } from '../api/get-own.ts';

/** The time zone in which an owner is told times; until it is known, the one of their browser. */
export function useOwnZone(): string | undefined {
  return useQuery(ownQuery(useScheme().id)).data?.timeZone;
}
