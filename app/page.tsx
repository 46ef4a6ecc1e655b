import Link from 'next/link';
import { FirstFigure } from '@/components/home/first-figure';

export default function HomePage() {
  return (
    <div className="pt-10 sm:pt-14">
      <h1 className="text-[2rem] leading-tight sm:text-[2.5rem]">What a noise level does to a nonlinear system</h1>
      <p className="mt-4 max-w-[42rem] font-serif text-lg leading-relaxed">
        Give a map and its noise: Smirr computes where the system spends its time, how fast it forgets how it started
        and how often it leaves its range. Every number comes with an uncertainty that holds, and a year later the same
        study gives the same number.
      </p>
      <p className="mt-6">
        <Link href="/explore" className="inline-block rounded-md bg-ink px-4 py-2 font-medium text-paper">
          Open the bench
        </Link>
        <span className="ml-4 text-muted max-sm:mt-2 max-sm:ml-0 max-sm:block">Works without an account.</span>
      </p>
      <div className="mt-10">
        <FirstFigure />
      </div>
    </div>
  );
}
