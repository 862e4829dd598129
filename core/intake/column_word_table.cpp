// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/column_word_table.h"

namespace dampwright {
namespace {

constexpr ColumnWords rows[] = {
    // English
    {Role::Time, Where::Anywhere, "time elapsed"},
    {Role::Time, Where::Alone, "seconds sec clock"},
    {Role::Time, Where::Whole, "t"},
    {Role::Displacement, Where::Anywhere, "displ position travel stroke deflection lvdt"},
    {Role::Displacement, Where::Alone, "disp pos pot"},
    {Role::Displacement, Where::Whole, "x"},
    {Role::Displacement, Where::Aside, "compression extension rebound bump jounce"},
    {Role::Force, Where::Anywhere, "force load"},
    {Role::Force, Where::Whole, "f"},
    {Role::Velocity, Where::Anywhere, "veloc speed"},
    {Role::Velocity, Where::Alone, "vel"},
    {Role::Velocity, Where::Whole, "v"},
    {Role::Temperature, Where::Anywhere, "temperatur thermo"},
    {Role::Temperature, Where::Alone, "temp"},
    {Role::Other,
     Where::Anywhere,
     "count cycle number pressure voltage accel frequency energy power error comment marker"},
    {Role::Other, Where::Alone, "index sample samples scan point no nr step current"},

    // German
    {Role::Time, Where::Anywhere, "zeit"},
    {Role::Time, Where::Alone, "sekunden"},
    {Role::Displacement, Where::Anywhere, "weg auslenkung verschiebung"},
    {Role::Displacement, Where::Tail, "hub"},
    {Role::Displacement, Where::Aside, "einfederung ausfederung"},
    {Role::Force, Where::Anywhere, "kraft"},
    {Role::Force, Where::Tail, "last"},
    {Role::Velocity, Where::Anywhere, "geschw"},
    {Role::Other,
     Where::Anywhere,
     "zyklus spannung beschleunigung frequenz energie leistung abweichung bemerkung anzahl"},
    {Role::Other, Where::Tail, "druck strom"},
    {Role::Other, Where::Alone, "nummer schritt messpunkt"},

    // French
    {Role::Time, Where::Anywhere, "temps horodat"},
    {Role::Time, Where::Alone, "duree heure"},
    {Role::Displacement, Where::Anywhere, "deplacement debattement"},
    {Role::Displacement, Where::Alone, "course depl"},
    {Role::Displacement, Where::Aside, "enfoncement allongement detente"},
    {Role::Force, Where::Alone, "effort efforts charge"},
    {Role::Velocity, Where::Anywhere, "vitesse"},
    {Role::Velocity, Where::Alone, "vit"},
    {Role::Other, Where::Anywhere, "courant frequence puissance echantillon commentaire erreur"},
    {Role::Other, Where::Alone, "pression indice numero etape pas tours"},

    // Italian
    {Role::Time, Where::Anywhere, "tempo"},
    {Role::Time, Where::Alone, "durata orario ora"},
    {Role::Displacement, Where::Anywhere, "spostamento posizione escursione"},
    {Role::Displacement, Where::Alone, "corsa"},
    {Role::Displacement, Where::Aside, "affondamento allungamento compressione estensione"},
    {Role::Force, Where::Anywhere, "forza"},
    {Role::Force, Where::Alone, "carico sforzo"},
    {Role::Other, Where::Anywhere, "corrente frequenza potenza campion commento errore tensione"},
    {Role::Other, Where::Alone, "pressione ciclo passo punto indice"},

    // Spanish
    {Role::Time, Where::Anywhere, "tiempo"},
    {Role::Time, Where::Alone, "hora duracion"},
    {Role::Displacement, Where::Anywhere, "desplazamiento posicion recorrido"},
    {Role::Displacement, Where::Alone, "carrera"},
    {Role::Displacement, Where::Aside, "elongacion compresion rebote"},
    {Role::Force, Where::Anywhere, "fuerza"},
    {Role::Force, Where::Alone, "carga esfuerzo"},
    {Role::Other,
     Where::Anywhere,
     "corriente frecuencia potencia muestra comentario voltaje aceleracion"},
    {Role::Other, Where::Alone, "presion ciclos paso etapa"},

    // Portuguese
    {Role::Time, Where::Alone, "duracao"},
    {Role::Displacement, Where::Anywhere, "deslocamento posicao percurso"},
    {Role::Displacement, Where::Alone, "curso"},
    {Role::Displacement, Where::Aside, "alongamento compressao extensao retorno"},
    {Role::Force, Where::Anywhere, "forca"},
    {Role::Force, Where::Alone, "esforco"},
    {Role::Other,
     Where::Anywhere,
     "frequencia amostra voltagem tensao aceleracao comentario contador"},
    {Role::Other, Where::Alone, "pressao ponto erro"},

    // Dutch
    {Role::Time, Where::Anywhere, "tijd"},
    {Role::Displacement, Where::Anywhere, "verplaatsing uitwijking"},
    {Role::Displacement, Where::Alone, "positie"},
    {Role::Displacement, Where::Tail, "slag"},
    {Role::Displacement, Where::Aside, "invering uitvering"},
    {Role::Force, Where::Anywhere, "kracht belasting"},
    {Role::Velocity, Where::Anywhere, "snelheid"},
    {Role::Other, Where::Anywhere, "spanning versnelling frequentie vermogen cyclus opmerking"},
    {Role::Other, Where::Tail, "druk stroom"},
    {Role::Other, Where::Alone, "monster stap volgnummer meetpunt fout"},

    // Japanese; of two words that end alike the longer one counts: 圧力 is no 力.
    {Role::Time, Where::Anywhere, "時間 時刻 経過 タイム 日時"},
    {Role::Displacement, Where::Anywhere, "変位 ストローク 位置 移動量 行程"},
    {Role::Displacement, Where::Aside, "伸び 縮み 圧縮量"},
    {Role::Force, Where::Anywhere, "荷重 減衰力 反力 ロード フォース"},
    {Role::Force, Where::Tail, "力"},
    {Role::Velocity, Where::Anywhere, "速度 速さ スピード"},
    {Role::Temperature, Where::Anywhere, "温度 油温"},
    {Role::Other,
     Where::Anywhere,
     "加速度 角速度 圧力 応力 電力 出力 電圧 電流 周波数 回数 サイクル 番号 サンプル 点数 ステップ "
     "エネルギー 備考 コメント 回転速度"},

    // Chinese, simplified and traditional
    {Role::Time, Where::Anywhere, "时间 时刻 時刻 计时 計時"},
    {Role::Displacement, Where::Anywhere, "位移 行程 冲程 衝程 挠度 撓度"},
    {Role::Displacement, Where::Aside, "压缩量 壓縮量 拉伸量 伸长 伸長"},
    {Role::Force, Where::Anywhere, "载荷 載荷 荷载 荷載 负荷 負荷 负载 負載 阻尼力 试验力 試驗力"},
    {Role::Velocity, Where::Anywhere, "速率"},
    {Role::Temperature, Where::Anywhere, "溫度 油溫 温升"},
    {Role::Other,
     Where::Anywhere,
     "压力 壓力 应力 應力 电力 電壓 电压 电流 频率 頻率 循环 循環 次数 次數 序号 序號 编号 編號 "
     "采样点 採樣點 能量 功率 备注 備註 步骤 步驟 加速度 转速 轉速"},
};

constexpr StrokeWords strokes[] = {
    {Direction::Compression,
     "compres bump jounce einfeder druck enfoncement affondamento invering ingaand 圧縮 縮み 圧側 "
     "压缩 壓縮"},
    {Direction::Rebound,
     "rebound extension ausfeder zug detente allongement estensione allungamento rebote elongacion "
     "extensao alongamento uitvering uitgaand 伸び 伸側 伸長 拉伸 回弹 回彈 复原 復原"},
};

}  // namespace

std::span<const ColumnWords> columnWords() { return rows; }

std::string_view commandWords() {
  return "command cmd setpoint target demand desired soll vorgabe consigne comando consigna cible "
         "obiettivo gewenst 指令 目標 目标 設定 设定";
}

std::string_view linkingWords() {
  return "of at on by for in im am an des der beim de du d del della dello di da do dos das em en "
         "no "
         "na nel nella au aux sur sul sulla van bij op";
}

std::span<const StrokeWords> strokeWords() { return strokes; }

std::string_view positiveWords() {
  return "positiv positif positief プラス が正 を正 为正 為正 是正 正方向";
}

std::string_view negativeWords() {
  return "negativ negatif negatief マイナス が負 を負 为负 為負 负方向 負方向";
}

}  // namespace dampwright
