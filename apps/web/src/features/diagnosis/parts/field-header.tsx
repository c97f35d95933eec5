import { useTranslation } from "react-i18next";
import { useNavigate } from "react-router-dom";

/** Top of a field screen: back, what is worked on, how far it climbed. Back never loses what was recorded. */
export function FieldHeader({ title, subtitle }: { title: string; subtitle: string }) {
  const { t } = useTranslation();
  const navigate = useNavigate();
  return (
    <header className="flex min-h-15 shrink-0 items-center border-b-3 border-ink bg-surface short:min-h-13">
      <button
        type="button"
        onClick={() => void navigate(-1)}
        aria-label={t("field.back")}
        className="focus-inside grid size-[56px] shrink-0 place-items-center self-stretch short:h-[52px]"
      >
        <svg
          viewBox="0 0 24 24"
          width={26}
          height={26}
          fill="none"
          stroke="currentColor"
          strokeWidth={2.6}
          aria-hidden="true"
        >
          <path d="M21 12H4M11 4.5 3.5 12l7.5 7.5" />
        </svg>
      </button>
      <div className="min-w-0 text-field">
        <p className="leading-5.5 font-semibold">{title}</p>
        <p className="leading-5.5 text-quiet">{subtitle}</p>
      </div>
    </header>
  );
}
