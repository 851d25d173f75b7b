/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Voltage Drive</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * An imposed linkage swing: V·t/2 to both sides of the linkage at the bias current.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.VoltageDrive#getVoltage <em>Voltage</em>}</li>
 *   <li>{@link gapwright.model.VoltageDrive#getOnTime <em>On Time</em>}</li>
 *   <li>{@link gapwright.model.VoltageDrive#getBias <em>Bias</em>}</li>
 *   <li>{@link gapwright.model.VoltageDrive#getWaveform <em>Waveform</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getVoltageDrive()
 * @model
 * @generated
 */
public interface VoltageDrive extends Drive {
	/**
	 * Returns the value of the '<em><b>Voltage</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Voltage</em>' attribute.
	 * @see #setVoltage(Quantity)
	 * @see gapwright.model.GapwrightPackage#getVoltageDrive_Voltage()
	 * @model dataType="gapwright.model.Voltage" required="true"
	 * @generated
	 */
	Quantity getVoltage();

	/**
	 * Sets the value of the '{@link gapwright.model.VoltageDrive#getVoltage <em>Voltage</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Voltage</em>' attribute.
	 * @see #getVoltage()
	 * @generated
	 */
	void setVoltage(Quantity value);

	/**
	 * Returns the value of the '<em><b>On Time</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>On Time</em>' attribute.
	 * @see #setOnTime(Quantity)
	 * @see gapwright.model.GapwrightPackage#getVoltageDrive_OnTime()
	 * @model dataType="gapwright.model.Time" required="true"
	 * @generated
	 */
	Quantity getOnTime();

	/**
	 * Sets the value of the '{@link gapwright.model.VoltageDrive#getOnTime <em>On Time</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>On Time</em>' attribute.
	 * @see #getOnTime()
	 * @generated
	 */
	void setOnTime(Quantity value);

	/**
	 * Returns the value of the '<em><b>Bias</b></em>' attribute.
	 * The default value is <code>"0 A"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Mean current.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Bias</em>' attribute.
	 * @see #setBias(Quantity)
	 * @see gapwright.model.GapwrightPackage#getVoltageDrive_Bias()
	 * @model default="0 A" dataType="gapwright.model.Current"
	 * @generated
	 */
	Quantity getBias();

	/**
	 * Sets the value of the '{@link gapwright.model.VoltageDrive#getBias <em>Bias</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Bias</em>' attribute.
	 * @see #getBias()
	 * @generated
	 */
	void setBias(Quantity value);

	/**
	 * Returns the value of the '<em><b>Waveform</b></em>' attribute.
	 * The literals are from the enumeration {@link gapwright.model.VoltageWaveform}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Shape of the voltage during the on-time; decides the volt-seconds.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Waveform</em>' attribute.
	 * @see gapwright.model.VoltageWaveform
	 * @see #setWaveform(VoltageWaveform)
	 * @see gapwright.model.GapwrightPackage#getVoltageDrive_Waveform()
	 * @model
	 * @generated
	 */
	VoltageWaveform getWaveform();

	/**
	 * Sets the value of the '{@link gapwright.model.VoltageDrive#getWaveform <em>Waveform</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Waveform</em>' attribute.
	 * @see gapwright.model.VoltageWaveform
	 * @see #getWaveform()
	 * @generated
	 */
	void setWaveform(VoltageWaveform value);

} // VoltageDrive
