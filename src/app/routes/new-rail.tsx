import { useNavigate, useParams } from 'react-router-dom';
import { Page } from '@/components/ui/page';
import { paths } from '@/config/paths';
import { useCreateRail } from '@/features/rails/api/rails';
import { SpecFormView } from '@/features/rails/components/spec-form';
import { EMPTY_SPEC } from '@/features/rails/lib/spec-form-values';

export function Component() {
  const { boardId = '' } = useParams();
  const navigate = useNavigate();
  const create = useCreateRail(boardId);
  return (
    <Page title="New rail" lead="Type values as you are used to: 4u7, 0.5 nH, 3m, 35 MHz.">
      <SpecFormView
        start={EMPTY_SPEC}
        submitText="Make the rail"
        pending={create.isPending}
        failure={create.error}
        onSubmit={(spec) =>
          create.mutate(spec, { onSuccess: ({ rail }) => navigate(paths.bench(boardId, rail.id)) })
        }
      />
    </Page>
  );
}
