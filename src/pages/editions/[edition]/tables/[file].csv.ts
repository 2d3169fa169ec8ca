import type { APIRoute } from 'astro';
import { csvRoutes } from '../../../../site/routes.ts';

export const getStaticPaths = csvRoutes;

/** A table's file, byte for byte as the tables were written. */
export const GET: APIRoute<{ csv: string }> = ({ props }) => new Response(props.csv);
