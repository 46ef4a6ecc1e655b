import type { Metadata } from 'next';
import { Bench } from '@/components/explore/bench';
import { firstPicture } from '@/components/first-study/first-result';
import { FIRST_STUDY } from '@/lib/shared/bench-study';
import { catalogueEntries } from '@/lib/shared/catalogue';
import { decodeStudy } from '@/lib/shared/decode-study';
import { encodeStudy } from '@/lib/shared/encode-study';
import { typesetStudy } from '@/lib/shared/typeset-study';

export const metadata: Metadata = { title: 'Explore' };

export default async function ExplorePage({ searchParams }: PageProps<'/explore'>) {
  const decoded = decodeStudy(await searchParams);
  const fault = decoded && 'fault' in decoded ? decoded.fault : undefined;
  const study = decoded && 'study' in decoded ? decoded.study : FIRST_STUDY;
  const typeset = typesetStudy(study);
  const typesets = typeset && study.system.formulas ? { [study.system.formulas[0]]: typeset } : {};
  const picture = encodeStudy(study) === encodeStudy(FIRST_STUDY) ? firstPicture() : null;
  return <Bench beginning={{ study, typesets, picture }} catalogue={catalogueEntries()} addressFault={fault} />;
}
