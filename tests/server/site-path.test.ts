import { expect, test } from 'vitest'
import { sitePath } from '@/lib/server/http/site-path'

test.each(['/projects', '/projects/a/facades/b?year=10#p1', '/'])('%s is ours', (path) => expect(sitePath(path)).toBe(path))

test.each(['//there.example', '/\\there.example', '/.//there.example', '/\t/there.example', 'https://there.example', 'projects', '', 'javascript:alert(1)', null, undefined, ['/projects'], `/${'a'.repeat(2000)}`])(
  '%s is not', (path) => expect(sitePath(path)).toBeNull(),
)
