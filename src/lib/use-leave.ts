import { useEffect, useState } from 'react';
import { useNavigate } from 'react-router-dom';

/**
 * Leaves a page whose form is done with: `isLeaving` is true a moment before the way is taken, so that what asks about unsaved
 * work knows of it in time.
 */
export function useLeave(): { isLeaving: boolean; leave: (to: string) => void } {
  const [to, setTo] = useState<string | null>(null);
  const navigate = useNavigate();
  useEffect(() => {
    if (to !== null) void navigate(to);
  }, [to, navigate]);
  return { isLeaving: to !== null, leave: setTo };
}
