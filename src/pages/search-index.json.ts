import { press } from '../site/press.ts';
import { searchIndex } from '../site/searchIndex.ts';

export async function GET(): Promise<Response> {
  return new Response(JSON.stringify(searchIndex(await press())));
}
