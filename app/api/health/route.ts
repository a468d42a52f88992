import { checkHealth } from '@/lib/services/health/check-health';

export const dynamic = 'force-dynamic';

export function GET(): Response {
  const health = checkHealth(Date.now());
  const status = health.database === 'ok' ? 200 : 503;
  return Response.json(health, { status, headers: { 'Cache-Control': 'no-store' } });
}
