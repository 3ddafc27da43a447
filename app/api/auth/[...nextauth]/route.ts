import { NextRequest } from 'next/server';
import NextAuth from 'next-auth';
import { limitedText, parsedJson } from '@/lib/auth/body';
import { authOptions } from '@/lib/auth/options';
import { problemResponse } from '@/lib/auth/problem';

interface Context {
  params: Promise<{ nextauth: string[] }>;
}

export async function GET(request: NextRequest, context: Context): Promise<Response> {
  return NextAuth(request, context, authOptions());
}

/** next-auth reads a body of any length, and fails on one that isn't what it says it is. */
export async function POST(request: NextRequest, context: Context): Promise<Response> {
  try {
    const body = await limitedText(request);
    if (request.headers.get('content-type')?.includes('application/json')) parsedJson(body);
    const whole = new NextRequest(request.url, { method: 'POST', headers: request.headers, body });
    return await NextAuth(whole, context, authOptions());
  } catch (error) {
    return problemResponse(error, 'next-auth');
  }
}
